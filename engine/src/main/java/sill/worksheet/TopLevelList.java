package sill.worksheet;

import java.util.ArrayList;
import java.util.List;
import sill.worksheet.ToleranceStudy.Target;

/** Splits a list at its commas, those in quotes and brackets apart. */
final class TopLevelList {
    private TopLevelList() {}

    /** The pieces from the cursor to its end; throws where a piece is empty. */
    static List<Target> read(Cursor cursor, SourceLine line, String expected) throws TextException {
        List<Target> pieces = new ArrayList<>();
        JavaText java = new JavaText();
        cursor.skipSpace();
        int start = cursor.position();
        while (true) {
            boolean comma = cursor.peek() == ',' && java.isOutside();
            if (cursor.atEnd() || comma) {
                String piece = cursor.between(start, cursor.position());
                if (piece.isEmpty()) {
                    throw TextException.expected(expected, cursor, "");
                }
                pieces.add(new Target(piece, line.number(), start + 1));
                if (cursor.atEnd()) {
                    break;
                }
                cursor.skip(1);
                cursor.skipSpace();
                start = cursor.position();
            } else {
                java.step(cursor.peek(), cursor.position());
                cursor.skip(1);
            }
        }
        if (java.openPlace() >= 0) {
            cursor.moveTo(java.openPlace());
            throw new TextException(
                    java.openPlace(),
                    "Found '" + cursor.peek() + "' without its partner, expected it closed in this line",
                    "");
        }
        return pieces;
    }
}
