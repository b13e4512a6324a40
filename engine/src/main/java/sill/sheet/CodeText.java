package sill.sheet;

/** Java text as characters: what is code, what is comment, what stands in quotes. */
public final class CodeText {
    private final String text;
    private final char[] code;
    private int at;
    private int unclosedComment = -1;

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

    /** Offset of a whole word at or behind {@code from}, or -1. */
    static int word(String codeOnly, String word, int from) {
        for (int at = codeOnly.indexOf(word, from); at >= 0; at = codeOnly.indexOf(word, at + 1)) {
            if (!isNamePart(codeOnly, at - 1) && !isNamePart(codeOnly, at + word.length())) {
                return at;
            }
        }
        return -1;
    }

    private static boolean isNamePart(String text, int at) {
        return at >= 0 && at < text.length() && Character.isJavaIdentifierPart(text.charAt(at));
    }

    /** Offset of a comment that is not closed, or -1. */
    static int unclosedComment(String text) {
        CodeText masked = new CodeText(text);
        masked.run();
        return masked.unclosedComment;
    }

    /** The text on one line: comments left out, and runs of blank space as one space where they stand outside quotes. */
    static String oneLine(String text) {
        CodeText masked = new CodeText(text);
        masked.run();
        StringBuilder line = new StringBuilder();
        for (int i = 0; i < text.length(); i++) {
            char code = masked.code[i];
            if (!Character.isWhitespace(code)) {
                line.append(text.charAt(i) == '\n' ? ' ' : text.charAt(i));
            } else if (line.length() > 0 && line.charAt(line.length() - 1) != ' ') {
                line.append(' ');
            }
        }
        return line.toString().strip();
    }

    private void run() {
        while (at < code.length) {
            if (text.startsWith("//", at)) {
                blank(lineEnd(at), ' ');
            } else if (text.startsWith("/*", at)) {
                int close = text.indexOf("*/", at + 2);
                unclosedComment = close < 0 ? at : -1;
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
