package sill.sheet;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import sill.formula.Expression;
import sill.worksheet.Problem;

/**
 * A sheet as one Java class, ready to be evaluated, and what the evaluator has to know of it.
 *
 * @param className simple name of the class
 * @param firstLineMethod a static method of the class that returns the line number of the class text's first line
 * @param imports the sheet's own import declarations, one each; {@link Translation#IMPORTS} come before
 * @param code the class
 * @param steps what to call, in order
 * @param missingGivens names of givens without a value
 * @param problems what is wrong with the Java, in the text's order
 */
public record TranslatedSheet(
        String className,
        String firstLineMethod,
        List<String> imports,
        Code code,
        List<Step> steps,
        Set<String> missingGivens,
        List<Problem> problems) {
    public TranslatedSheet {
        imports = List.copyOf(imports);
        steps = List.copyOf(steps);
        missingGivens = Set.copyOf(missingGivens);
        problems = List.copyOf(problems);
    }

    /** The class's text and the way back from it to the worksheet. */
    public static final class Code {
        private final MappedText text;

        Code(MappedText text) {
            this.text = text;
        }

        MappedText mapped() {
            return text;
        }

        /** The text. */
        public String text() {
            return text.toString();
        }

        /** The worksheet place that an offset of the text stands for. */
        public Place place(int offset) {
            return text.origin(offset).place();
        }

        /** The worksheet place that a line of the text stands for, lines from 1. */
        public Place linePlace(int line) {
            return text.lineOrigin(line).place();
        }

        /** The number of the cell that an offset of the text belongs to; 0 when the text has no such cell. */
        public int cell(int offset) {
            return text.isEmpty() ? 0 : text.origin(offset).piece().cell();
        }
    }

    /**
     * A method of the class to call: a calculation cell, the expressions of a tolerance cell, or one line of a check cell.
     *
     * @param cell number of the cell
     * @param place place of the cell's header, or of the check's expression
     * @param where how messages call it
     * @param method name of the static method; empty when a problem keeps it from running
     * @param needs names of other cells that it uses, to the cells that declare them
     * @param results what it gives; empty for a check
     * @param study whether it is a tolerance cell, whose results are what it studies
     * @param check the check's names, for a check line
     */
    public record Step(
            int cell,
            Place place,
            String where,
            Optional<String> method,
            Map<String, Integer> needs,
            List<ResultField> results,
            boolean study,
            Optional<CheckNames> check) {
        public Step {
            results = List.copyOf(results);
        }
    }

    /** What a check line's expression is made from. */
    public record CheckNames(List<String> uses, List<String> dependsOn) {}

    /**
     * A static field that holds a result.
     *
     * @param field its name in the class
     * @param name its name in the worksheet; empty for a bare expression
     * @param index its place among the cell's results, from 1
     * @param line its line in the worksheet
     * @param formula the Java it comes from, on one line
     * @param type its type, without packages
     * @param unit coherent SI unit symbol; empty when unknown
     * @param componentUnits those of a record's components, as far as they are known
     * @param shownIn the unit its caption asks for; empty when none
     * @param meaning what the Java means as mathematics; empty when it has none
     */
    public record ResultField(
            String field,
            String name,
            int index,
            int line,
            String formula,
            String type,
            String unit,
            Map<String, String> componentUnits,
            String shownIn,
            String caption,
            List<String> uses,
            List<String> dependsOn,
            Optional<Expression> meaning) {}
}
