package sill.record;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import sill.formula.WorkingOut;
import sill.record.DesignRecord.CellEntry;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.DataFile;
import sill.record.DesignRecord.Made;
import sill.record.DesignRecord.Outcome;
import sill.record.DesignRecord.PlotEntry;
import sill.record.DesignRecord.Source;
import sill.record.DesignRecord.ToleranceEntry;
import sill.record.DesignRecord.ValueEntry;
import sill.record.DesignRecord.Verdict;
import sill.units.Unit;
import sill.values.CellRun;
import sill.values.CellState;
import sill.values.Finding;
import sill.values.Result;
import sill.values.RunResult;
import sill.worksheet.Cell;
import sill.worksheet.Given;
import sill.worksheet.Problem;
import sill.worksheet.Worksheet;

/** Puts a record together from the worksheet and what its run gave. */
public final class Assembly {
    private final Worksheet worksheet;
    private final RunResult run;
    private final List<Problem> problems;

    private Assembly(Worksheet worksheet, RunResult run, List<Problem> problems) {
        this.worksheet = worksheet;
        this.run = run;
        this.problems = problems;
    }

    /**
     * A record.
     *
     * @param source the worksheet's file
     * @param files its data files
     * @param fileProblems what is wrong with those
     */
    public static DesignRecord record(
            Worksheet worksheet,
            Source source,
            List<DataFile> files,
            List<Problem> fileProblems,
            RunResult run,
            Made made) {
        Set<Problem> problems = new LinkedHashSet<>(worksheet.problems());
        problems.addAll(fileProblems);
        problems.addAll(run.problems());
        List<Problem> sorted = new ArrayList<>(problems);
        sorted.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return new Assembly(worksheet, run, sorted).record(source, files, made);
    }

    private DesignRecord record(Source source, List<DataFile> files, Made made) {
        List<CellEntry> cells = worksheet.cells().stream().map(this::cell).toList();
        List<CheckEntry> checks = Judge.judge(worksheet, run);
        return new DesignRecord(
                outcome(cells, checks),
                worksheet.titleBlock().fields(),
                made,
                Map.of(),
                source,
                files,
                cells,
                GivenEntries.of(worksheet),
                values(),
                tolerances(),
                checks,
                plots(),
                problems);
    }

    private Outcome outcome(List<CellEntry> cells, List<CheckEntry> checks) {
        boolean complete = problems.stream().noneMatch(Problem::isError)
                && cells.stream().allMatch(cell -> cell.state() == CellState.DONE)
                && checks.stream().noneMatch(check -> check.verdict() == Verdict.NOT_JUDGED);
        if (!complete) {
            return Outcome.INCOMPLETE;
        }
        return checks.stream().allMatch(check -> check.verdict() == Verdict.HOLDS) ? Outcome.HOLDS : Outcome.FAILS;
    }

    private CellEntry cell(Cell cell) {
        boolean wrong = problems.stream().anyMatch(problem -> problem.isError() && problem.cell() == cell.number());
        CellRun ran = run.cells().stream()
                .filter(each -> each.number() == cell.number())
                .findFirst()
                .orElse(new CellRun(cell.number(), wrong ? CellState.PROBLEM : CellState.DONE, "", List.of(), ""));
        return new CellEntry(
                cell.number(),
                cell.kind().word(),
                cell.caption(),
                cell.line(),
                ran.state(),
                ran.reason(),
                ran.output(),
                cell.source());
    }

    private List<ValueEntry> values() {
        KnownValues known = new KnownValues(worksheet, run.results());
        return run.results().stream()
                .filter(result -> result.plot().isEmpty())
                .map(result -> value(result, known))
                .toList();
    }

    private List<ToleranceEntry> tolerances() {
        StudiedChecks studied = new StudiedChecks(worksheet, run.findings());
        Map<String, Unit> units = givenUnits();
        List<ToleranceEntry> entries = new ArrayList<>();
        for (Finding finding : run.findings()) {
            String at = finding.cell() + "." + finding.index();
            entries.add(
                    new ToleranceEntry(finding, at, studied.target(finding).line(), studied.limits(finding), units));
        }
        return entries;
    }

    private Map<String, Unit> givenUnits() {
        Map<String, Unit> units = new LinkedHashMap<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Givens givens) {
                for (Given given : givens.givens()) {
                    if (given.value() instanceof Given.Quantity quantity) {
                        units.put(given.name(), quantity.unit());
                    }
                }
            }
        }
        return units;
    }

    private static ValueEntry value(Result result, KnownValues known) {
        ShownValue shown = ShownValue.of(result);
        ResultText text = new ResultText(result, shown);
        return new ValueEntry(
                result.name(),
                result.formula(),
                result.type(),
                result.value(),
                result.unit(),
                result.componentUnits(),
                shown.text(),
                shown.full(),
                shown.components(),
                result.caption(),
                result.address(),
                result.line(),
                result.uses(),
                result.dependsOn(),
                result.meaning().flatMap(meaning -> WorkingOut.of(result.name(), meaning, known, text)));
    }

    private List<PlotEntry> plots() {
        Set<String> named = run.results().stream()
                .filter(result -> result.plot().isPresent())
                .map(Result::name)
                .collect(Collectors.toCollection(HashSet::new));
        named.remove("");
        return run.results().stream()
                .filter(result -> result.plot().isPresent())
                // A bare name of a plot shows what its variable showed already.
                .filter(result -> !result.name().isEmpty() || !named.contains(result.formula()))
                .map(result -> new PlotEntry(
                        result.address(),
                        result.name(),
                        result.caption().isEmpty() ? result.plot().orElseThrow().title() : result.caption(),
                        result.plot().orElseThrow(),
                        result.uses(),
                        result.dependsOn()))
                .toList();
    }
}
