package sill.worksheet;

import java.util.ArrayList;
import java.util.List;

/**
 * A line of the worksheet.
 *
 * @param number from 1
 * @param text without its line end
 */
record SourceLine(int number, String text) {

    /** Splits at LF, CRLF and a lone CR, as the Java compiler counts lines. */
    static List<SourceLine> split(String text) {
        List<SourceLine> lines = new ArrayList<>();
        int start = 0;
        for (int at = 0; at < text.length(); at++) {
            char c = text.charAt(at);
            if (c == '\n' || c == '\r') {
                lines.add(new SourceLine(lines.size() + 1, text.substring(start, at)));
                if (c == '\r' && at + 1 < text.length() && text.charAt(at + 1) == '\n') {
                    at++;
                }
                start = at + 1;
            }
        }
        if (start < text.length()) {
            lines.add(new SourceLine(lines.size() + 1, text.substring(start)));
        }
        return lines;
    }

    boolean isBlank() {
        return text.chars().allMatch(Cursor::isSpace);
    }

    /** Whether the line is a comment in a cell that is not Java. */
    boolean isComment() {
        Cursor cursor = new Cursor(text);
        cursor.skipSpace();
        return cursor.startsWith("//");
    }

    boolean isHeader() {
        return text.startsWith("::");
    }
}
