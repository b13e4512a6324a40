package sill.worker;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import sill.sheet.Slicer;
import sill.sheet.TranslatedSheet;
import sill.values.Result;
import sill.words.Quoted;
import sill.worksheet.Problem;

/** Studies tolerance cells in this process: finds out what varies, cuts the slice, has it repeated. */
final class StudyRunner implements Studies {
    private final Slicer slicer;
    private final GivenValues givens;
    private final Map<String, Job.Spread> spreads = new HashMap<>();
    private final Map<Integer, Job.StudyOrder> orders = new HashMap<>();
    private final Consumer<Report> reports;

    StudyRunner(Slicer slicer, GivenValues givens, Job job, Consumer<Report> reports) {
        this.slicer = slicer;
        this.givens = givens;
        this.reports = reports;
        job.values().forEach((name, value) -> {
            if (value instanceof Job.GivenValue.Number number) {
                number.spread().ifPresent(spread -> spreads.put(name, spread));
            }
        });
        job.studies().forEach(order -> orders.put(order.cell(), order));
    }

    @Override
    public Outcome study(TranslatedSheet.Step step, List<Result> nominal) {
        StudyTargets targets = new StudyTargets();
        List<Problem> problems = new ArrayList<>();
        for (Result result : nominal) {
            if (!targets.add(step.results().get(result.index() - 1).field(), result)) {
                problems.add(Problem.error(
                        result.line(),
                        1,
                        step.cell(),
                        step.where() + ": found a " + result.type() + " behind 'of:', " + Quoted.of(result.formula())
                                + ", expected a number or a record of numbers",
                        "Name a number that is made from it."));
            }
        }
        if (!problems.isEmpty()) {
            return new Outcome(List.of(), problems);
        }
        Job.StudyOrder order = orders.get(step.cell());
        List<String> varied = varied(targets, order);
        if (varied.isEmpty()) {
            problems.add(Problem.error(
                    step.place().line(),
                    step.place().column(),
                    step.cell(),
                    step.where()
                            + ": found no given to vary, expected one with limits on which the studied values rest",
                    "Give one of " + String.join(", ", slicer.givens(targets.outputs())) + " a tolerance."));
            return new Outcome(List.of(), problems);
        }
        Optional<SliceCode> code =
                SliceCode.agreeing(slicer, step.cell(), targets.outputs(), varied, givens.values(), targets.nominal());
        if (code.isEmpty()) {
            problems.add(Problem.error(
                    step.place().line(),
                    step.place().column(),
                    step.cell(),
                    step.where()
                            + ": its calculation, repeated at the nominal values, does not give what the cells gave",
                    "Keep nothing from one repetition for the next, such as a count in a class; if nothing is kept,"
                            + " please report it with the worksheet."));
            return new Outcome(List.of(), problems);
        }
        return new Outcome(List.of(), List.of());
    }

    /** In the order of the worksheet: those asked for, or all with limits that the results rest on; not those held. */
    private List<String> varied(StudyTargets targets, Job.StudyOrder order) {
        Set<String> wanted = new HashSet<>(order.vary().isEmpty() ? spreads.keySet() : order.vary());
        wanted.removeAll(order.hold());
        return slicer.givens(targets.outputs()).stream()
                .filter(wanted::contains)
                .filter(spreads::containsKey)
                .toList();
    }
}
