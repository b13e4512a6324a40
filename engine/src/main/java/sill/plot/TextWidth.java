package sill.plot;

import sill.markup.VisibleText;

/**
 * How wide a text will be, about. A drawing must not depend on the fonts of the machine that makes it, so widths are those
 * of a common sans-serif face, rounded up.
 */
public final class TextWidth {
    /** Font size of all text in a drawing. */
    public static final int FONT_SIZE = 13;

    private TextWidth() {}

    /** The width of a text on one line. */
    public static double of(String text) {
        return text.codePoints().mapToDouble(TextWidth::share).sum() * FONT_SIZE;
    }

    /** The text as it will be seen, or as much of its start as fits, with an ellipsis. */
    public static String fit(String raw, double width) {
        String text = VisibleText.of(raw).replace('\n', ' ');
        if (of(text) <= width) {
            return text;
        }
        int end = 0;
        double used = FONT_SIZE;
        while (end < text.length()) {
            int code = text.codePointAt(end);
            used += share(code) * FONT_SIZE;
            if (used > width) {
                break;
            }
            end += Character.charCount(code);
        }
        return text.substring(0, end).stripTrailing() + "…";
    }

    private static double share(int code) {
        if (code >= 0x2E80) {
            return 1.05;
        }
        if ("ijlI.,:;'|!()[] \u00A0tfr/".indexOf(code) >= 0) {
            return 0.36;
        }
        if (code == 'm' || code == 'w' || code == 'M' || code == 'W' || code == '…') {
            return 0.9;
        }
        return code >= 'A' && code <= 'Z' || code == 'Ω' ? 0.7 : 0.64;
    }
}
