package sill.worksheet;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import sill.words.NearestWord;
import sill.words.Quoted;
import sill.worksheet.Cell.Kind;

/**
 * The first line of a cell.
 *
 * @param kind what the cell is; for a misspelled kind the nearest one, and a note when none is near
 * @param caption text after the kind, may be empty
 */
record CellHeader(Kind kind, String caption) {
    private static final List<String> WORDS =
            Arrays.stream(Kind.values()).map(Kind::word).toList();

    static CellHeader read(SourceLine line, ProblemList problems) {
        Cursor cursor = new Cursor(line.text());
        cursor.skip(2);
        cursor.skipSpace();
        int start = cursor.position();
        String word = cursor.word();
        cursor.skip(word.length());
        String caption = cursor.rest();
        Optional<Kind> kind = kind(word);
        if (kind.isEmpty()) {
            problems.error(
                    line.number(),
                    start + 1,
                    "Found " + (word.isEmpty() ? "a cell without a kind" : "the kind of cell " + Quoted.of(word))
                            + ", expected one of " + String.join(", ", WORDS),
                    word.isEmpty() ? "Write ':: calc Caption'." : NearestWord.hint(word, WORDS, ""));
        }
        Kind nearest = kind.or(() -> NearestWord.to(word, WORDS).flatMap(CellHeader::kind))
                .orElse(Kind.NOTE);
        return new CellHeader(nearest, caption);
    }

    /**
     * Reports a line that was probably meant to start a cell. Prose and Java may hold such a line for a reason; other cells may
     * not.
     *
     * @return whether it was reported as an error
     */
    static boolean reportIndented(SourceLine line, Kind cell, ProblemList problems) {
        Cursor cursor = new Cursor(line.text());
        cursor.skipSpace();
        int indent = cursor.position();
        // CommonMark, 4.4: a line of code in a note.
        boolean code = cell == Kind.NOTE && indent >= 4;
        if (indent == 0 || code || !cursor.take("::") || !Cursor.isSpace(cursor.peek())) {
            return false;
        }
        cursor.skipSpace();
        String word = cursor.word();
        if (kind(word).isEmpty()) {
            return false;
        }
        String message = "Found ':: " + word + "' after a space, expected a cell to start in column 1";
        boolean warning = cell == Kind.NOTE || cell == Kind.CALC;
        if (warning) {
            problems.warning(line.number(), indent + 1, message, "Delete the space before it if a cell starts here.");
        } else {
            problems.error(line.number(), indent + 1, message, "Delete the space before it.");
        }
        return !warning;
    }

    private static Optional<Kind> kind(String word) {
        return Arrays.stream(Kind.values())
                .filter(kind -> kind.word().equals(word))
                .findFirst();
    }
}
