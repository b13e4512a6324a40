package sill.worksheet;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import sill.words.NearestWord;
import sill.words.Quoted;
import sill.worksheet.Check.Basis;
import sill.worksheet.Given.Quantity;
import sill.worksheet.ToleranceStudy.Method;
import sill.worksheet.ToleranceStudy.Target;

/** What tolerance cells say of givens, and checks of tolerance cells. */
final class CrossReferences {
    /** Among more names a misspelled one is not sought, lest a large sheet take long. */
    private static final int MOST_LIKELY = 500;

    private final ProblemList problems;
    private final Map<String, Given> givens = new HashMap<>();
    private final Set<String> wrong = new HashSet<>();
    private final Set<String> worstCases = new HashSet<>();
    private final Set<String> sampled = new HashSet<>();
    private List<String> likely = List.of();
    private boolean studiesAreWhole = true;

    private CrossReferences(ProblemList problems) {
        this.problems = problems;
    }

    static void check(List<Cell> cells, ProblemList problems) {
        CrossReferences references = new CrossReferences(problems);
        cells.forEach(references::collect);
        references.likely =
                references.givens.keySet().stream().sorted().limit(MOST_LIKELY).toList();
        for (Cell cell : cells) {
            problems.enterCell(cell.number());
            if (cell instanceof Cell.Tolerance tolerance) {
                references.names(tolerance.study());
            } else if (cell instanceof Cell.Checks checks && references.studiesAreWhole) {
                checks.checks().forEach(references::basis);
            }
        }
    }

    private void collect(Cell cell) {
        if (cell instanceof Cell.Givens those) {
            those.givens().forEach(given -> givens.put(given.name(), given));
            wrong.addAll(those.wrong());
        } else if (cell instanceof Cell.Tolerance tolerance) {
            studiesAreWhole &= !problems.hasErrorIn(cell.number());
            ToleranceStudy study = tolerance.study();
            for (Target target : study.of()) {
                String text = target.key();
                for (Method method : study.methods()) {
                    if (method instanceof Method.WorstCase) {
                        worstCases.add(text);
                    } else if (method instanceof Method.MonteCarlo) {
                        sampled.add(text);
                    }
                }
            }
        }
    }

    private void names(ToleranceStudy study) {
        Set<String> varied = new HashSet<>();
        study.vary().forEach(target -> varied.add(target.text()));
        study.vary().forEach(this::givenWithLimits);
        study.over().ifPresent(this::givenWithLimits);
        for (Target target : study.hold()) {
            given(target);
            if (varied.contains(target.text())) {
                problems.error(
                        target.line(),
                        target.column(),
                        "Found " + Quoted.of(target.text())
                                + " under 'vary:' and 'hold:', expected it under one of them",
                        "");
            }
        }
    }

    private void givenWithLimits(Target target) {
        Given given = given(target);
        if (given != null && !(given.value() instanceof Quantity quantity && quantity.hasLimits())) {
            problems.error(
                    target.line(),
                    target.column(),
                    "Found " + Quoted.of(target.text()) + ", expected a given with limits to vary between",
                    given.value() instanceof Quantity ? "Give it a tolerance on line " + given.line() + "." : "");
        }
    }

    /** The given of that name; null, with a problem unless it has one already, when there is none. */
    private Given given(Target target) {
        Given given = givens.get(target.text());
        if (given == null && !wrong.contains(target.text())) {
            problems.error(
                    target.line(),
                    target.column(),
                    "Found " + Quoted.of(target.text()) + ", expected the name of a given",
                    NearestWord.hint(target.text(), likely, ""));
        }
        return given;
    }

    private void basis(Check check) {
        String expression = check.key();
        if (check.basis() instanceof Basis.WorstCase && !worstCases.contains(expression)) {
            missing(check, "worst-case", "worst-case");
        } else if (check.basis() instanceof Basis.Share && !sampled.contains(expression)) {
            missing(check, "monte-carlo", "monte-carlo 200000 seed 7");
        }
    }

    private void missing(Check check, String method, String example) {
        problems.error(
                check.line(),
                check.column(),
                "Found " + Quoted.of(check.expression())
                        + " judged over tolerance, expected a tolerance cell that studies it by " + method,
                "Add it behind 'of:' in a tolerance cell with 'method: " + example + "'.");
    }
}
