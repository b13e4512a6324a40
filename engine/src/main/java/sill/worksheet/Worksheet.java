package sill.worksheet;

import java.util.List;

/**
 * A parsed worksheet.
 *
 * @param text the text as read, without a byte order mark
 * @param titleBlock the fields before the first cell
 * @param cells the cells in order
 * @param problems what is wrong with the text, in its order
 */
public record Worksheet(String text, TitleBlock titleBlock, List<Cell> cells, List<Problem> problems) {
    public Worksheet {
        cells = List.copyOf(cells);
        problems = List.copyOf(problems);
    }

    /**
     * Reads a worksheet. Every text has a result; what is wrong in it is among the problems.
     *
     * @param text the whole file; a byte order mark at its start is left out, and LF, CRLF and a lone CR end a line
     */
    public static Worksheet parse(String text) {
        return WorksheetParser.parse(text);
    }
}
