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
}
