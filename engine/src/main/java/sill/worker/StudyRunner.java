package sill.worker;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import sill.sheet.Slice;
import sill.sheet.Slicer;
import sill.sheet.TranslatedSheet;
import sill.study.Findings;
import sill.study.Study;
import sill.study.StudyPlan;
import sill.values.Finding;
import sill.values.Result;
import sill.words.Quoted;
import sill.worksheet.Problem;

/** Studies tolerance cells in this process: finds out what varies, cuts the slice, has it repeated. */
final class StudyRunner implements Studies {
    private static final String SERIES = "Series";

    private final Slicer slicer;
    private final GivenValues givens;
    private final Map<String, Job.Spread> spreads = new HashMap<>();
    private final Map<Integer, Job.StudyOrder> orders = new HashMap<>();
    private final Map<String, String> captionUnits = new HashMap<>();
    private final Consumer<Report> reports;

    StudyRunner(Slicer slicer, TranslatedSheet sheet, GivenValues givens, Job job, Consumer<Report> reports) {
        sheet.steps().forEach(step -> step.results().forEach(field -> captionUnits.put(field.name(), field.shownIn())));
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

    /** Why a cell can't be studied. */
    private static final class NotStudied extends Exception {
        private static final long serialVersionUID = 1;
        private final transient List<Problem> problems;

        NotStudied(List<Problem> problems) {
            this.problems = problems;
        }
    }

    @Override
    public Outcome study(TranslatedSheet.Step step, List<Result> nominal) {
        try {
            List<Problem> problems = new ArrayList<>();
            return new Outcome(findings(step, nominal, problems), problems);
        } catch (NotStudied e) {
            return new Outcome(List.of(), e.problems);
        } catch (InterruptedException e) {
            throw new IllegalStateException("nothing here interrupts a study", e);
        }
    }

    private List<Finding> findings(TranslatedSheet.Step step, List<Result> nominal, List<Problem> problems)
            throws NotStudied, InterruptedException {
        Map<Integer, Integer> lines = new HashMap<>();
        nominal.forEach(result -> lines.put(result.index(), result.line()));
        List<StudyTarget> targets = new ArrayList<>();
        List<Slice.Output> outputs = new ArrayList<>();
        collect(step, nominal, targets, outputs);
        Job.StudyOrder order = orders.get(step.cell());
        List<String> varied = varied(outputs, order);
        if (varied.isEmpty()) {
            throw problem(
                    step,
                    "found no given to vary, expected one with limits on which the studied values rest",
                    "Give such a given a tolerance; 'hold:' and 'vary:' leave out others.");
        }
        StudyPlans plans = new StudyPlans(order, targets, varied, givens.values(), spreads);
        SliceCode code = SliceCode.agreeing(slicer, step.cell(), outputs, varied, givens.values(), plans.nominal())
                .orElseThrow(() -> problem(
                        step,
                        "its calculation, repeated at the nominal values, does not give what the cells gave",
                        "Let nothing be kept from one repetition for the next, such as a count in a class; if nothing is,"
                                + " please report it with the worksheet."));
        StudyPlan plan = plans.whole();
        List<Findings> found = Study.run(plan, code::newModel, new StudyProgress(reports));
        List<Optional<Finding.Sweep>> sweeps = order.over().isPresent()
                ? new StudySweep(plans, code, order.over().get()).run()
                : targets.stream()
                        .map(target -> Optional.<Finding.Sweep>empty())
                        .toList();
        FindingWriter writer = new FindingWriter(varied, notes(step.cell(), outputs));
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < targets.size(); i++) {
            StudyTarget target = targets.get(i);
            FindingWriter.notFinite(found.get(i))
                    .ifPresent(words -> problems.add(Problem.error(
                            lines.get(target.index()),
                            1,
                            step.cell(),
                            step.where() + ", " + Quoted.of(target.name()) + ": found "
                                    + words.substring(0, words.length() - 1) + ", expected one in every repetition",
                            "Guard the calculation where it fails, or narrow the limits that lead there. The figures are those"
                                    + " of the others.")));
            findings.add(writer.write(target, found.get(i), plans.shareLines(target), sweeps.get(i)));
        }
        return findings;
    }

    private void collect(
            TranslatedSheet.Step step, List<Result> nominal, List<StudyTarget> targets, List<Slice.Output> outputs)
            throws NotStudied {
        List<Problem> problems = new ArrayList<>();
        for (Result result : nominal) {
            List<StudyTarget> numbers = StudyTarget.of(result, captionUnits.getOrDefault(result.formula(), ""));
            if (numbers.isEmpty() || numbers.stream().anyMatch(number -> !Double.isFinite(number.nominal()))) {
                String found = numbers.isEmpty() ? "a " + result.type() : "a value that is not finite";
                problems.add(Problem.error(
                        result.line(),
                        1,
                        step.cell(),
                        step.where() + ": found " + found + " in " + Quoted.of(result.formula())
                                + ", expected a finite number or a record of them",
                        "Name a number that is made from it."));
            } else {
                targets.addAll(numbers);
                outputs.add(StudyTarget.output(step.results().get(result.index() - 1), numbers));
            }
        }
        if (!problems.isEmpty()) {
            throw new NotStudied(problems);
        }
    }

    /** In the order of the worksheet: those asked for, or all with limits that the results rest on; not those held. */
    private List<String> varied(List<Slice.Output> outputs, Job.StudyOrder order) {
        Set<String> wanted = new HashSet<>(order.vary().isEmpty() ? spreads.keySet() : order.vary());
        wanted.removeAll(order.hold());
        return slicer.givens(outputs).stream()
                .filter(wanted::contains)
                .filter(spreads::containsKey)
                .toList();
    }

    private List<String> notes(int cell, List<Slice.Output> outputs) {
        return slicer.mentions(cell, outputs, SERIES)
                ? List.of(
                        "A preferred part that the worksheet chooses is chosen anew in every repetition. Where it is to"
                                + " stay, state it as a given, with its tolerance.")
                : List.of();
    }

    private static NotStudied problem(TranslatedSheet.Step step, String found, String hint) {
        return new NotStudied(List.of(Problem.error(
                step.place().line(), step.place().column(), step.cell(), step.where() + ": " + found, hint)));
    }
}
