package sill.worksheet;

import java.util.List;

/**
 * Finds where the requirement of a check line starts and where its remark does.
 *
 * <p>The expression before them is any Java, and may hold the requirement's words in quotes or brackets, {@code ||} and
 * {@code |}. In Java no word follows an operand, so the requirement starts at the first of its words that does, outside quotes
 * and brackets; the remark starts at the first single {@code |} after that.
 */
final class CheckSplitter {
    private static final List<String> ONE_WORD = List.of("within", "equals", "holds");
    private static final int NONE = -1;

    private final String text;
    private final JavaText java = new JavaText();

    private CheckSplitter(String text) {
        this.text = text;
    }

    /**
     * The two places.
     *
     * @param requirement where the requirement starts
     * @param end where the remark's {@code |} stands, or the end of the line
     */
    record Split(int requirement, int end) {}

    static Split split(String text) throws TextException {
        return new CheckSplitter(text).split();
    }

    private Split split() throws TextException {
        int atStart = NONE;
        boolean afterOperand = false;
        boolean blankSoFar = true;
        for (int at = 0; at < text.length(); at++) {
            char c = text.charAt(at);
            if (java.isOutside() && startsRequirement(at)) {
                if (afterOperand) {
                    return new Split(at, remark(at));
                }
                atStart = blankSoFar ? at : atStart;
            }
            java.step(c, at);
            if (!Cursor.isSpace(c)) {
                blankSoFar = false;
                afterOperand = java.isOutside() && endsOperand(c);
            }
        }
        if (atStart != NONE) {
            return new Split(atStart, remark(atStart));
        }
        throw nothingFound();
    }

    private static boolean endsOperand(char c) {
        return Character.isJavaIdentifierPart(c) || ")]}\"'.".indexOf(c) >= 0;
    }

    private int remark(int from) {
        int bar = text.indexOf('|', from);
        return bar < 0 ? text.length() : bar;
    }

    private boolean startsRequirement(int at) {
        if ("weha".indexOf(text.charAt(at)) < 0) {
            return false;
        }
        if (at > 0 && (Character.isJavaIdentifierPart(text.charAt(at - 1)) || text.charAt(at - 1) == '.')) {
            return false;
        }
        Cursor ahead = new Cursor(text, at, text.length());
        boolean word = ONE_WORD.stream().anyMatch(ahead::takeWord);
        if (!word && ahead.takeWord("at")) {
            ahead.skipSpace();
            word = ahead.takeWord("least") || ahead.takeWord("most");
        }
        // "within(" is a call.
        return word && ahead.peek() != '(' && ahead.peek() != '.';
    }

    private TextException nothingFound() {
        int open = java.openPlace();
        if (open >= 0) {
            return new TextException(
                    open,
                    "Found '" + text.charAt(open) + "' without its partner, expected it closed before the requirement",
                    "");
        }
        Cursor start = new Cursor(text);
        start.skipSpace();
        return TextException.expected(
                "an expression and one of 'within A .. B', 'at least A', 'at most A', 'equals A ± t', 'holds'",
                start,
                "Write 'band at least 600 mV'.");
    }
}
