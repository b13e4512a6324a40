package sill.worksheet;

import java.util.ArrayList;
import java.util.List;
import sill.worksheet.Check.Basis;
import sill.worksheet.Check.Limit;
import sill.worksheet.Check.Requirement;
import sill.worksheet.Given.Distribution;
import sill.worksheet.Given.Quantity;
import sill.worksheet.Given.Tolerance;
import sill.worksheet.ToleranceStudy.Method;
import sill.worksheet.ToleranceStudy.Target;

/** A parsed worksheet as the spec writes it. */
final class SpecNotation {
    private final List<String> lines = new ArrayList<>();

    private SpecNotation() {}

    static String of(Worksheet sheet, String kind) {
        SpecNotation notation = new SpecNotation();
        boolean whole = kind.equals("sheet");
        if (whole || kind.equals("title")) {
            sheet.titleBlock().fields().forEach((key, text) -> notation.lines.add("field " + key + " = " + text));
        }
        for (Cell cell : sheet.cells()) {
            if (whole) {
                notation.lines.add("cell " + cell.number() + ": line " + cell.line() + ", "
                        + cell.kind().word() + ", {" + cell.caption() + "}");
                cell.source().lines().forEach(line -> notation.lines.add("  > " + line));
            }
            if (whole || cell.number() == 1) {
                notation.content(cell);
            }
        }
        sheet.problems().forEach(notation::problem);
        // A space at a line's end would be lost in an editor.
        return SpecExample.withSigns(String.join("\n", notation.lines)).replaceAll("(?m) $", "␠");
    }

    private void content(Cell cell) {
        if (cell instanceof Cell.Givens givens) {
            givens.givens().forEach(this::given);
            givens.wrong().forEach(name -> lines.add("wrong " + name));
        } else if (cell instanceof Cell.Checks checks) {
            checks.checks().forEach(this::check);
        } else if (cell instanceof Cell.Tolerance tolerance) {
            study(tolerance.study());
        }
    }

    private void given(Given given) {
        String remark = given.remark().isEmpty() ? "" : " | " + given.remark();
        lines.add(given.line() + ":" + given.column() + " " + given.name() + " = " + value(given.value()) + remark);
    }

    private static String value(Given.Value value) {
        if (value instanceof Quantity quantity) {
            return quantity.nominal() + " in " + quantity.unit().symbol() + limits(quantity);
        }
        if (value instanceof Given.Quantities list) {
            return list.values() + " in " + list.unit().symbol();
        }
        return value instanceof Given.Text text
                ? "text {" + text.text().replace("\n", "⏎") + "}"
                : "file {" + ((Given.DataFile) value).path() + "}";
    }

    private static String limits(Quantity quantity) {
        if (!quantity.hasLimits()) {
            return "";
        }
        String kind = quantity.tolerance() instanceof Tolerance.Relative
                ? "relative"
                : quantity.tolerance() instanceof Tolerance.Absolute ? "absolute" : "range";
        Distribution distribution = quantity.distribution();
        String spread = distribution instanceof Distribution.Normal normal
                ? "normal " + normal.k()
                : distribution instanceof Distribution.Uniform ? "uniform" : "triangular";
        return ", " + kind + " " + quantity.low() + " .. " + quantity.high() + ", " + spread;
    }

    private void check(Check check) {
        String remark = check.remark().isEmpty() ? "" : " | " + check.remark();
        lines.add(check.line() + ":" + check.column() + " {" + check.expression() + "} "
                + requirement(check.requirement()) + basis(check.basis()) + remark);
    }

    private static String requirement(Requirement requirement) {
        if (requirement instanceof Requirement.Within within) {
            return "within " + limit(within.low()) + " .. " + limit(within.high());
        }
        if (requirement instanceof Requirement.AtLeast least) {
            return "at least " + limit(least.low());
        }
        if (requirement instanceof Requirement.AtMost most) {
            return "at most " + limit(most.high());
        }
        return requirement instanceof Requirement.EqualTo equal
                ? "equals " + limit(equal.value()) + " ± " + equal.distance()
                : "holds";
    }

    private static String limit(Limit limit) {
        return limit.value() + " in " + limit.unit().symbol();
    }

    private static String basis(Basis basis) {
        return basis instanceof Basis.WorstCase
                ? ", worst-case"
                : basis instanceof Basis.Share share ? ", share " + share.share() : "";
    }

    private void study(ToleranceStudy study) {
        study.of().forEach(target -> target("of", target));
        for (Method method : study.methods()) {
            lines.add("method "
                    + (method instanceof Method.MonteCarlo sampling
                            ? "monte-carlo " + sampling.samples() + " seed " + sampling.seed()
                            : method instanceof Method.WorstCase ? "worst-case" : "rss"));
        }
        study.vary().forEach(target -> target("vary", target));
        study.hold().forEach(target -> target("hold", target));
        study.over().ifPresent(target -> target("over", target));
    }

    private void target(String key, Target target) {
        lines.add(key + " " + target.line() + ":" + target.column() + " {" + target.text() + "}");
    }

    private void problem(Problem problem) {
        lines.add((problem.isError() ? "error " : "warning ") + problem.line() + ":" + problem.column() + " cell "
                + problem.cell() + ": " + problem.message());
        if (!problem.hint().isEmpty()) {
            lines.add("  mend: " + problem.hint());
        }
    }
}
