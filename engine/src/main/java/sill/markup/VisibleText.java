package sill.markup;

import java.util.Locale;

/**
 * Text in which nothing hides. Control and formatting characters, which could reorder a line, end a page early or make two
 * names look alike, are written as their code in brackets, as in {@code [U+202E]}; line feed and tab stay.
 */
public final class VisibleText {
    private VisibleText() {}

    /** The text with every hidden character as its code; a carriage return before a line feed is dropped. */
    public static String of(String text) {
        int at = 0;
        while (at < text.length() && isPlain(text.charAt(at))) {
            at++;
        }
        if (at == text.length()) {
            return text;
        }
        StringBuilder visible = new StringBuilder(text.length() + 16).append(text, 0, at);
        while (at < text.length()) {
            int code = text.codePointAt(at);
            int next = at + Character.charCount(code);
            boolean lineEnd = code == '\r' && next < text.length() && text.charAt(next) == '\n';
            if (isHidden(code) && !lineEnd) {
                visible.append("[U+");
                String digits = Integer.toHexString(code).toUpperCase(Locale.ROOT);
                visible.append("0".repeat(Math.max(0, 4 - digits.length()))).append(digits);
                visible.append(']');
            } else if (!lineEnd) {
                visible.appendCodePoint(code);
            }
            at = next;
        }
        return visible.toString();
    }

    /** Whether a character is certainly not a hidden one. */
    static boolean isPlain(char c) {
        return c >= ' ' && c < 0x7F || c == '\n' || c == '\t';
    }

    /**
     * An own list, because the classes of {@link Character} change with the Unicode version of the Java in use. The joiners
     * U+200C and U+200D stay: several scripts are not spelt right without them.
     */
    private static boolean isHidden(int code) {
        if (code < 0xA0) {
            return code < ' ' && code != '\n' && code != '\t' || code >= 0x7F;
        }
        return code == 0xAD
                || code == 0x61C
                || code == 0x115F
                || code == 0x1160
                || code == 0x180E
                || code == 0x200B
                || code >= 0x200E && code <= 0x200F
                || code >= 0x2028 && code <= 0x202E
                || code >= 0x2060 && code <= 0x206F
                || code == 0x3164
                || code >= 0xD800 && code <= 0xDFFF
                || code >= 0xFDD0 && code <= 0xFDEF
                || code == 0xFEFF
                || code == 0xFFA0
                || code >= 0xFFF9 && code <= 0xFFFB
                || (code & 0xFFFE) == 0xFFFE
                || code >= 0xE0000 && code <= 0xE0FFF;
    }
}
