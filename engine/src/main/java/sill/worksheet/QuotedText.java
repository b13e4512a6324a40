package sill.worksheet;

import sill.words.Quoted;

/** Reads a text in double quotes; {@code \"}, {@code \\}, {@code \n} and {@code \t} mean what they mean in Java. */
final class QuotedText {
    private QuotedText() {}

    /** Reads from the opening quote to behind the closing one. */
    static String read(Cursor cursor) throws TextException {
        int open = cursor.position();
        cursor.skip(1);
        StringBuilder text = new StringBuilder();
        while (!cursor.atEnd()) {
            char c = cursor.peek();
            cursor.skip(1);
            if (c == '"') {
                return text.toString();
            }
            text.append(c == '\\' ? escaped(cursor) : c);
        }
        throw unclosed(open);
    }

    static TextException unclosed(int open) {
        return new TextException(
                open, "Found '\"' without its partner, expected a text in quotes", "Close it with '\"'.");
    }

    private static char escaped(Cursor cursor) throws TextException {
        char c = cursor.peek();
        int at = cursor.position() - 1;
        boolean atEnd = cursor.atEnd();
        cursor.skip(1);
        return switch (c) {
            case '"', '\\' -> c;
            case 'n' -> '\n';
            case 't' -> '\t';
            default ->
                throw new TextException(
                        at,
                        "Found " + Quoted.of(atEnd ? "\\" : "\\" + c) + ", expected \\\", \\\\, \\n or \\t",
                        "Write a backslash as '\\\\'.");
        };
    }
}
