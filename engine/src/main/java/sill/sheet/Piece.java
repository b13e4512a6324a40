package sill.sheet;

import sill.words.Quoted;

/**
 * A piece of worksheet text that goes into the class: a calculation cell or a check's expression.
 *
 * @param cell number of its cell
 * @param text the piece
 * @param line worksheet line of its first character
 * @param column worksheet column of its first character
 * @param where how messages call it, as in {@code Cell 3 'Trip points'}
 */
record Piece(int cell, String text, int line, int column, String where) {
    static Piece of(SheetSource.CodeCell cell) {
        String caption = cell.caption().isEmpty() ? "" : " " + Quoted.of(cell.caption());
        return new Piece(cell.number(), cell.source(), cell.line() + 1, 1, "Cell " + cell.number() + caption);
    }

    static Piece of(SheetSource.CheckLine check) {
        return new Piece(
                check.cell(),
                check.expression(),
                check.line(),
                check.column(),
                "Cell " + check.cell() + ", " + Quoted.of(check.expression()));
    }

    Place place(int offset) {
        return Place.in(text, offset, line, column);
    }
}
