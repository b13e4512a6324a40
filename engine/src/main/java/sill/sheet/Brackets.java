package sill.sheet;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/** Finds the bracket that has no partner: what its author wants to be shown, where a parser sees only what follows from it. */
final class Brackets {
    private static final String OPENING = "([{";
    private static final String CLOSING = ")]}";

    private Brackets() {}

    /**
     * The first closing bracket without an opening one, else the innermost opening bracket without a closing one.
     *
     * @param codeOnly a piece, masked by {@link CodeText#codeOnly}
     */
    static Optional<SnippetParser.Fault> fault(String codeOnly, Span span) {
        Deque<Integer> open = new ArrayDeque<>();
        for (int i = span.start(); i < span.end(); i++) {
            char c = codeOnly.charAt(i);
            int closing = CLOSING.indexOf(c);
            if (OPENING.indexOf(c) >= 0) {
                open.push(i);
            } else if (closing >= 0) {
                if (open.isEmpty()) {
                    return Optional.of(unpaired(i, c, OPENING.charAt(closing)));
                }
                if (codeOnly.charAt(open.peek()) != OPENING.charAt(closing)) {
                    break;
                }
                open.pop();
            }
        }
        if (open.isEmpty()) {
            return Optional.empty();
        }
        char opening = codeOnly.charAt(open.peek());
        return Optional.of(unpaired(open.peek(), opening, CLOSING.charAt(OPENING.indexOf(opening))));
    }

    private static SnippetParser.Fault unpaired(int at, char found, char expected) {
        return new SnippetParser.Fault(at, Wording.OURS, "found '" + found + "' without its '" + expected + "'");
    }
}
