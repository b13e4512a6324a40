package sill.sheet;

import java.util.List;
import java.util.Map;

/**
 * What the translation starts from: the parts of a worksheet that hold or name Java.
 *
 * @param givens fields that are set before any cell runs
 * @param cells calculation and tolerance cells in order
 * @param checks check expressions in order
 */
public record SheetSource(List<GivenField> givens, List<CodeCell> cells, List<CheckLine> checks) {
    public SheetSource {
        givens = List.copyOf(givens);
        cells = List.copyOf(cells);
        checks = List.copyOf(checks);
    }

    /** Java type of a given. */
    public enum GivenType {
        NUMBER("double"),
        NUMBERS("double[]"),
        TEXT("String"),
        TABLE("sill.stdlib.Table"),
        /** Its line is wrong or its file can't be read: what uses it waits. */
        MISSING("");

        private final String java;

        GivenType(String java) {
            this.java = java;
        }

        /** The type as Java spells it. */
        public String java() {
            return java;
        }
    }

    /**
     * A given.
     *
     * @param unit coherent SI unit symbol; empty for a text or a table
     * @param columns of a table: coherent unit symbols of its number columns
     */
    public record GivenField(
            String name, GivenType type, int cell, int line, String unit, Map<String, String> columns) {
        /** A given that is no table. */
        public GivenField(String name, GivenType type, int cell, int line, String unit) {
            this(name, type, cell, line, unit, Map.of());
        }

        /** The same, with what its file's header tells. */
        public GivenField withColumns(Map<String, String> units) {
            return new GivenField(name, type, cell, line, unit, units);
        }
    }

    /**
     * A cell that gives values: a calculation cell, which is Java as a whole, or a tolerance cell, in which the expressions
     * that it studies are.
     *
     * @param line line of the header; the source starts on the next
     * @param studied where in the source of a tolerance cell the expressions stand; empty in a calculation cell
     */
    public record CodeCell(int number, String caption, int line, String source, List<Span> studied) {
        public CodeCell {
            studied = List.copyOf(studied);
        }

        /** A calculation cell. */
        public CodeCell(int number, String caption, int line, String source) {
            this(number, caption, line, source, List.of());
        }
    }

    /**
     * A check's expression.
     *
     * @param column column of its first character; with the line it names the check
     * @param condition whether it must be a boolean, else a number
     * @param unit coherent SI unit symbol of its limits; empty when nothing is demanded
     */
    public record CheckLine(int cell, int line, int column, String expression, boolean condition, String unit) {
        Place place() {
            return new Place(line, column);
        }
    }
}
