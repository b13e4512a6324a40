package sill.cli;

import java.util.List;

/** A line of a worksheet with a caret under a column, cut to what fits a terminal. */
final class Excerpt {
    private static final int LONGEST = 100;

    private Excerpt() {}

    /** Two lines: the worksheet's, with its number, and the caret's. */
    static List<String> around(String line, int number, int column) {
        int at = Math.max(0, Math.min(column - 1, line.length()));
        int from = at < LONGEST * 4 / 5 ? 0 : at - LONGEST / 2;
        int to = Math.min(line.length(), from + LONGEST);
        String before = (from > 0 ? "…" : "") + Terminal.safe(line.substring(from, at));
        String behind = Terminal.safe(line.substring(at, to)) + (to < line.length() ? "…" : "");
        String margin = " ".repeat(String.valueOf(number).length());
        return List.of(
                "  " + number + " | " + before + behind,
                "  " + margin + " | " + " ".repeat(before.codePointCount(0, before.length())) + "^");
    }
}
