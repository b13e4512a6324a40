package sill.worksheet;

import java.util.List;

/**
 * A cell of a worksheet: from its {@code :: kind caption} line to the line before the next one.
 *
 * <p>{@code number} counts from 1 over all cells, {@code line} is the line of the header, and {@code source} the text of the
 * lines after it with LF between them, without blank lines at its end. The first line of {@code source} is line
 * {@code line + 1} of the worksheet.
 */
public sealed interface Cell {
    int number();

    String caption();

    int line();

    String source();

    /** The kind as the worksheet spells it. */
    default Kind kind() {
        // An exhaustive switch over a sealed type needs Java 21.
        if (this instanceof Note) {
            return Kind.NOTE;
        }
        if (this instanceof Givens) {
            return Kind.GIVEN;
        }
        if (this instanceof Calculation) {
            return Kind.CALC;
        }
        return this instanceof Tolerance ? Kind.TOLERANCE : Kind.CHECK;
    }

    /** The five kinds of cell. */
    enum Kind {
        NOTE("note"),
        GIVEN("given"),
        CALC("calc"),
        TOLERANCE("tolerance"),
        CHECK("check");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        /** The word in the worksheet. */
        public String word() {
            return word;
        }
    }

    /** Prose in CommonMark. */
    record Note(int number, String caption, int line, String source) implements Cell {}

    /**
     * Input values; lines that are wrong are missing from {@code givens}. {@code wrong} holds the names whose value could not
     * be read: they are declared, and what rests on them waits.
     */
    record Givens(int number, String caption, int line, String source, List<Given> givens, List<String> wrong)
            implements Cell {
        public Givens {
            givens = List.copyOf(givens);
            wrong = List.copyOf(wrong);
        }

        /** Givens that are all right. */
        public Givens(int number, String caption, int line, String source, List<Given> givens) {
            this(number, caption, line, source, givens, List.of());
        }
    }

    /** Java. */
    record Calculation(int number, String caption, int line, String source) implements Cell {}

    /** What is to be studied over tolerances. */
    record Tolerance(int number, String caption, int line, String source, ToleranceStudy study) implements Cell {}

    /** Requirements; lines that are wrong are missing from {@code checks}. */
    record Checks(int number, String caption, int line, String source, List<Check> checks) implements Cell {
        public Checks {
            checks = List.copyOf(checks);
        }
    }
}
