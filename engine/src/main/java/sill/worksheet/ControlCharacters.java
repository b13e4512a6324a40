package sill.worksheet;

import sill.words.Quoted;

/** Finds characters that no line of text holds: controls other than the tab, and halves of surrogate pairs. */
final class ControlCharacters {
    private ControlCharacters() {}

    /** Reports the first one in a line. */
    static boolean report(SourceLine line, ProblemList problems) {
        String text = line.text();
        for (int at = 0; at < text.length(); at++) {
            char c = text.charAt(at);
            boolean pair = Character.isHighSurrogate(c)
                    && at + 1 < text.length()
                    && Character.isLowSurrogate(text.charAt(at + 1));
            if (pair) {
                at++;
            } else if (Character.isISOControl(c) && c != '\t' || Character.isSurrogate(c)) {
                problems.error(
                        line.number(),
                        at + 1,
                        "Found " + (Character.isSurrogate(c) ? "half a surrogate pair " : "the control character ")
                                + Quoted.name(c) + ", expected text",
                        "Delete it; an editor may show it as a blank.");
                return true;
            }
        }
        return false;
    }
}
