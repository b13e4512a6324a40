package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import sill.values.CellRun;
import sill.values.CellState;
import sill.values.CheckValue;
import sill.values.Datum;
import sill.values.Result;
import sill.values.RunResult;
import sill.worksheet.Problem;

/** A run's result as {@code spec/java-cells.txt} writes it. */
final class RunNotation {
    private final List<String> lines = new ArrayList<>();

    private RunNotation() {}

    /** Everything that differs from a cell that ended and gave nothing. */
    static String of(RunResult run, boolean withTrace) {
        RunNotation notation = new RunNotation();
        for (CellRun cell : run.cells()) {
            run.results().stream()
                    .filter(result -> result.cell() == cell.number())
                    .forEach(result -> notation.result(result, withTrace));
            notation.cell(cell);
        }
        run.checks().forEach(check -> notation.check(check, withTrace));
        run.problems().forEach(notation::problem);
        return String.join("\n", notation.lines);
    }

    private void result(Result result, boolean withTrace) {
        String name = result.name().isEmpty() ? "" : result.name() + " ";
        // A pure number needs no word.
        String unit = result.unit().isEmpty() || result.unit().equals("1") ? "" : " in " + result.unit();
        String shown = result.shownIn().isEmpty() ? "" : ", shown in " + result.shownIn();
        String caption = result.caption().isEmpty() ? "" : " | " + result.caption();
        lines.add(result.address() + " " + name + ": " + result.type() + " = " + datum(result.value()) + unit + shown
                + caption);
        if (withTrace) {
            trace(result.uses(), result.dependsOn());
        }
    }

    private void trace(List<String> uses, List<String> dependsOn) {
        lines.add("  uses " + String.join(", ", uses) + "; depends on " + String.join(", ", dependsOn));
    }

    private void cell(CellRun cell) {
        if (cell.state() != CellState.DONE) {
            lines.add("cell " + cell.number() + ": " + cell.state().word() + ", " + cell.reason());
        }
        if (!cell.output().isEmpty()) {
            lines.add("cell " + cell.number() + ": prints {" + oneLine(cell.output()) + "}");
        }
    }

    private void check(CheckValue check, boolean withTrace) {
        lines.add("check " + check.line() + " = " + datum(check.value()));
        if (withTrace) {
            trace(check.uses(), check.dependsOn());
        }
    }

    private void problem(Problem problem) {
        String severity = problem.isError() ? "error " : "warning ";
        lines.add(severity + problem.line() + ":" + problem.column() + " cell " + problem.cell() + ": "
                + oneLine(problem.message()));
        if (!problem.hint().isEmpty()) {
            lines.add("  mend: " + problem.hint());
        }
    }

    static String datum(Datum datum) {
        if (datum instanceof Datum.Real real) {
            return String.valueOf(real.value());
        } else if (datum instanceof Datum.Whole whole) {
            return whole.digits();
        } else if (datum instanceof Datum.Truth truth) {
            return String.valueOf(truth.value());
        } else if (datum instanceof Datum.Text text) {
            return "{" + oneLine(text.value()) + "}";
        } else if (datum instanceof Datum.Items items) {
            String shown = items.items().stream().map(RunNotation::datum).collect(Collectors.joining(", "));
            return "[" + shown + (items.size() > items.items().size() ? ", … of " + items.size() : "") + "]";
        } else if (datum instanceof Datum.Fields fields) {
            return fields.fields().entrySet().stream()
                    .map(field -> field.getKey() + ": " + datum(field.getValue()))
                    .collect(Collectors.joining(", ", "(", ")"));
        }
        return datum instanceof Datum.Opaque opaque ? "<" + oneLine(opaque.text()) + ">" : "none";
    }

    private static String oneLine(String text) {
        return text.replace("\n", "⏎");
    }
}
