package sill.worksheet;

import java.util.Arrays;

/** Follows one line of Java from left to right and tells whether a place lies outside quotes and brackets. */
final class JavaText {
    private static final int NONE = -1;

    private int[] brackets = new int[8];
    private int depth;
    private char quote;
    private int quotePlace = NONE;
    private boolean escaped;

    /** Takes the next character. */
    void step(char c, int place) {
        if (quotePlace != NONE) {
            if (escaped) {
                escaped = false;
            } else if (c == '\\') {
                escaped = true;
            } else if (c == quote) {
                quotePlace = NONE;
            }
            return;
        }
        switch (c) {
            case '"', '\'' -> {
                quote = c;
                quotePlace = place;
            }
            case '(', '[', '{' -> open(place);
            case ')', ']', '}' -> depth = Math.max(0, depth - 1);
            default -> {}
        }
    }

    boolean isOutside() {
        return depth == 0 && quotePlace == NONE;
    }

    /** The place of the open quote or the innermost open bracket; −1 when there is none. */
    int openPlace() {
        if (quotePlace != NONE) {
            return quotePlace;
        }
        return depth > 0 ? brackets[depth - 1] : NONE;
    }

    private void open(int place) {
        if (depth == brackets.length) {
            brackets = Arrays.copyOf(brackets, 2 * depth);
        }
        brackets[depth++] = place;
    }
}
