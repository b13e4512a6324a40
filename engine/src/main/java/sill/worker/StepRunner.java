package sill.worker;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;
import sill.sheet.Place;
import sill.sheet.SheetSource;
import sill.sheet.TranslatedSheet;
import sill.stdlib.Plot;
import sill.stdlib.Unit;
import sill.values.CellRun;
import sill.values.CellState;
import sill.values.CheckValue;
import sill.values.Datum;
import sill.values.Result;
import sill.worksheet.Problem;

/** Calls a sheet's cells and checks in order and reports what each gave. */
final class StepRunner {
    private final TranslatedSheet sheet;
    private final Class<?> code;
    private final CapturedOutput output;
    private final Studies studies;
    private final Consumer<Report> reports;
    private final Set<Place> leftOut;
    private final Set<Integer> lostCells = new TreeSet<>();
    private final Snapshots snapshots = new Snapshots();
    private int firstLine;

    StepRunner(
            TranslatedSheet sheet,
            Class<?> code,
            Set<Place> leftOut,
            CapturedOutput output,
            Studies studies,
            Consumer<Report> reports) {
        this.studies = studies;
        this.sheet = sheet;
        this.code = code;
        this.output = output;
        this.reports = reports;
        this.leftOut = leftOut;
    }

    /** Runs all; {@code givens} are looked after like results. */
    void run(List<SheetSource.GivenField> givens) throws ReflectiveOperationException {
        firstLine = (int) code.getMethod(sheet.firstLineMethod()).invoke(null);
        for (SheetSource.GivenField given : givens) {
            Object value = code.getField(given.name()).get(null);
            snapshots.keep(given.name(), given.cell(), given.line(), value, DatumReader.read(value, ""));
        }
        for (TranslatedSheet.Step step : sheet.steps()) {
            if (!leftOut.contains(step.place())) {
                run(step);
            } else if (step.check().isEmpty()) {
                lostCells.add(step.cell());
            }
        }
        reports.accept(new Report.Finished(snapshots.problems(code)));
    }

    private void run(TranslatedSheet.Step step) throws ReflectiveOperationException {
        List<String> waits = step.needs().entrySet().stream()
                .filter(need -> lostCells.contains(need.getValue())
                        || sheet.missingGivens().contains(need.getKey()))
                .map(Map.Entry::getKey)
                .toList();
        if (!waits.isEmpty()) {
            lose(step, CellState.NOT_RUN, "waits on " + waits(step, waits), waits, List.of());
        } else if (step.method().isEmpty()) {
            lose(step, CellState.PROBLEM, "its Java is wrong", List.of(), List.of());
        } else {
            reports.accept(new Report.Begun(step.cell(), step.place()));
            call(step, step.method().get());
        }
    }

    /** As in {@code trip (cell 3), band (cell 3)}. */
    private static String waits(TranslatedSheet.Step step, List<String> names) {
        return String.join(
                ", ",
                names.stream()
                        .map(name -> name + " (cell " + step.needs().get(name) + ")")
                        .toList());
    }

    private void lose(
            TranslatedSheet.Step step, CellState state, String reason, List<String> waitsOn, List<Problem> problems) {
        if (step.check().isPresent()) {
            reports.accept(new Report.CheckEnded(step.cell(), step.place(), Optional.empty(), reason, problems));
        } else {
            lostCells.add(step.cell());
            CellRun run = new CellRun(step.cell(), state, reason, waitsOn, output.take());
            reports.accept(
                    step.study()
                            ? new Report.StudyEnded(run, List.of(), problems)
                            : new Report.CellEnded(run, List.of(), problems));
        }
    }

    private void call(TranslatedSheet.Step step, String method) throws ReflectiveOperationException {
        Object value;
        try {
            value = code.getMethod(method).invoke(null);
        } catch (InvocationTargetException e) {
            Throwable thrown = cause(e);
            Problem problem = Failure.problem(sheet, step, thrown, firstLine);
            lose(step, CellState.PROBLEM, "ended in " + thrown.getClass().getSimpleName(), List.of(), List.of(problem));
            return;
        }
        if (step.check().isPresent()) {
            TranslatedSheet.CheckNames names = step.check().get();
            CheckValue check = new CheckValue(
                    step.place().line(), DatumReader.read(value, ""), "", names.uses(), names.dependsOn());
            reports.accept(new Report.CheckEnded(step.cell(), step.place(), Optional.of(check), "", List.of()));
        } else {
            List<Result> results = new ArrayList<>();
            for (TranslatedSheet.ResultField field : step.results()) {
                results.add(result(step, field));
            }
            if (step.study()) {
                study(step, results);
            } else {
                reports.accept(new Report.CellEnded(done(step), results, List.of()));
            }
        }
    }

    private void study(TranslatedSheet.Step step, List<Result> nominal) {
        Studies.Outcome outcome = studies.study(step, nominal);
        if (outcome.failed()) {
            lose(step, CellState.PROBLEM, "see the problems", List.of(), outcome.problems());
        } else {
            reports.accept(new Report.StudyEnded(done(step), outcome.findings(), outcome.problems()));
        }
    }

    private CellRun done(TranslatedSheet.Step step) {
        return new CellRun(step.cell(), CellState.DONE, "", List.of(), output.take());
    }

    /** What the author's own text threw; a type that can't be set up wraps it once more. */
    private static Throwable cause(Throwable wrapper) {
        Throwable thrown = wrapper.getCause() == null ? wrapper : wrapper.getCause();
        return thrown instanceof ExceptionInInitializerError && thrown.getCause() != null ? thrown.getCause() : thrown;
    }

    private Result result(TranslatedSheet.Step step, TranslatedSheet.ResultField field)
            throws ReflectiveOperationException {
        Object value = code.getField(field.field()).get(null);
        Datum datum = DatumReader.read(value, field.type());
        if (!field.name().isEmpty()) {
            snapshots.keep(field.name(), step.cell(), field.line(), value, datum);
        }
        Map<String, String> componentUnits = componentUnits(value, field);
        boolean alike = !componentUnits.isEmpty()
                && componentUnits.size() == ((Datum.Fields) datum).fields().size()
                && Set.copyOf(componentUnits.values()).size() == 1;
        String common = alike ? componentUnits.values().iterator().next() : "";
        return new Result(
                field.name(),
                step.cell(),
                field.index(),
                field.line(),
                field.formula(),
                field.type(),
                datum,
                value instanceof Plot plot ? Optional.of(plot) : Optional.empty(),
                field.unit().isEmpty() ? common : field.unit(),
                field.shownIn(),
                componentUnits,
                field.caption(),
                field.uses(),
                field.dependsOn(),
                field.meaning());
    }

    /** The units of a record's components: as its type states them, else as its value was inferred. */
    private static Map<String, String> componentUnits(Object value, TranslatedSheet.ResultField field) {
        Map<String, String> units = new LinkedHashMap<>();
        if (value instanceof Record && !(value instanceof Plot)) {
            for (RecordComponent component : value.getClass().getRecordComponents()) {
                Unit unit = component.getAnnotation(Unit.class);
                String inferred = field.componentUnits().get(component.getName());
                if (unit != null || inferred != null) {
                    units.put(component.getName(), unit != null ? unit.value() : inferred);
                }
            }
        }
        return units;
    }
}
