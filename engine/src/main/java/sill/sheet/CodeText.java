package sill.sheet;

/** Java text as characters: what is code, what is comment, what stands in quotes. */
public final class CodeText {
    private final String text;
    private final char[] code;
    private int at;

    private CodeText(String text) {
        this.text = text;
        this.code = text.toCharArray();
    }

    /**
     * The text with comments blanked and the contents of strings and characters replaced by {@code _}, at the same offsets
     * and with the same line breaks.
     */
    public static String codeOnly(String text) {
        CodeText masked = new CodeText(text);
        masked.run();
        return new String(masked.code);
    }

    /** Offset just behind the last character of code before {@code end}; {@code start} when there is none. */
    public static int endOfCode(String codeOnly, int start, int end) {
        int last = end;
        while (last > start && Character.isWhitespace(codeOnly.charAt(last - 1))) {
            last--;
        }
        return last;
    }

    private void run() {
        while (at < code.length) {
            if (text.startsWith("//", at)) {
                blank(lineEnd(at), ' ');
            } else if (text.startsWith("/*", at)) {
                int close = text.indexOf("*/", at + 2);
                blank(close < 0 ? code.length : close + 2, ' ');
            } else if (text.startsWith("\"\"\"", at)) {
                at += 3;
                blank(closing("\"\"\"", code.length), '_');
                at = Math.min(code.length, at + 3);
            } else if (code[at] == '"' || code[at] == '\'') {
                String quote = String.valueOf(code[at]);
                at++;
                blank(closing(quote, lineEnd(at)), '_');
                at++;
            } else {
                at++;
            }
        }
    }

    private int lineEnd(int from) {
        int end = text.indexOf('\n', from);
        return end < 0 ? code.length : end;
    }

    private int closing(String quote, int limit) {
        int i = at;
        while (i < limit && !text.startsWith(quote, i)) {
            i += code[i] == '\\' ? 2 : 1;
        }
        return Math.min(i, limit);
    }

    private void blank(int end, char with) {
        for (; at < end; at++) {
            if (code[at] != '\n') {
                code[at] = with;
            }
        }
    }
}
