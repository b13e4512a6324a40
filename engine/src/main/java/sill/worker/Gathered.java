package sill.worker;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import sill.sheet.Place;
import sill.values.CellRun;
import sill.values.CellState;
import sill.values.CheckValue;
import sill.values.Finding;
import sill.values.Result;
import sill.values.RunResult;
import sill.words.Quoted;
import sill.worksheet.Cell;
import sill.worksheet.Problem;
import sill.worksheet.Worksheet;

/** What the workers of a run gave, the first word on each cell and check. */
final class Gathered {
    private final Map<Integer, CellRun> cells = new TreeMap<>();
    private final Map<Integer, String> captions = new HashMap<>();
    private final List<Result> results = new ArrayList<>();
    private final List<Finding> findings = new ArrayList<>();
    private final Map<Place, CheckValue> checks = new TreeMap<>();
    private final Map<Integer, String> withoutValue = new HashMap<>();
    private final Set<Place> endedChecks = new HashSet<>();
    private final Set<Place> stopped = new LinkedHashSet<>();
    private final Set<Problem> problems = new LinkedHashSet<>();
    private final Set<Integer> codeCells = new LinkedHashSet<>();

    /**
     * A worker that ended too early.
     *
     * @param cell the cell it was at; 0 while it translated
     * @param place the place it was at
     * @param reason why, as in {@code it took longer than 60 s}
     * @param hint how to mend it
     */
    record Stop(int cell, Place place, String reason, String hint) {
        static Stop at(Report.Begun step, String reason, String hint) {
            return new Stop(step.cell(), step.place(), reason, hint);
        }
    }

    Gathered(Worksheet worksheet) {
        for (Cell cell : worksheet.cells()) {
            captions.put(cell.number(), cell.caption());
            if (cell instanceof Cell.Calculation || cell instanceof Cell.Tolerance) {
                codeCells.add(cell.number());
            }
        }
    }

    Set<Place> stopped() {
        return stopped;
    }

    void take(Report report) {
        if (report instanceof Report.Translated translated) {
            problems.addAll(translated.problems());
        } else if (report instanceof Report.CellEnded ended) {
            if (cells.putIfAbsent(ended.run().number(), ended.run()) == null) {
                results.addAll(ended.results());
                problems.addAll(ended.problems());
            }
        } else if (report instanceof Report.StudyEnded ended) {
            if (cells.putIfAbsent(ended.run().number(), ended.run()) == null) {
                findings.addAll(ended.findings());
                problems.addAll(ended.problems());
            }
        } else if (report instanceof Report.CheckEnded ended) {
            if (endedChecks.add(ended.place())) {
                ended.value()
                        .ifPresentOrElse(
                                value -> checks.put(ended.place(), value),
                                () -> withoutValue.put(ended.place().line(), ended.reason()));
                problems.addAll(ended.problems());
            }
        } else if (report instanceof Report.Finished finished) {
            problems.addAll(finished.problems());
        }
    }

    void stop(Stop stop) {
        String where = stop.cell() == 0
                ? "The worksheet's Java"
                : "Cell " + stop.cell()
                        + (captions.get(stop.cell()).isEmpty() ? "" : " " + Quoted.of(captions.get(stop.cell())));
        problems.add(Problem.error(
                stop.place().line(),
                stop.place().column(),
                stop.cell(),
                where + ": stopped, " + stop.reason(),
                stop.hint()));
        if (stop.cell() > 0) {
            stopped.add(stop.place());
            endedChecks.add(stop.place());
            withoutValue.put(stop.place().line(), stop.reason());
            stopCell(stop.cell(), stop.reason());
        } else {
            codeCells.forEach(cell -> stopCell(cell, stop.reason()));
        }
    }

    private void stopCell(int cell, String reason) {
        if (codeCells.contains(cell)) {
            cells.putIfAbsent(cell, new CellRun(cell, CellState.STOPPED, reason, List.of(), ""));
        }
    }

    RunResult result() {
        findings.sort(Comparator.comparingInt(Finding::cell).thenComparingInt(Finding::index));
        results.sort(Comparator.comparingInt(Result::cell).thenComparingInt(Result::index));
        List<Problem> sorted = new ArrayList<>(problems);
        sorted.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return new RunResult(
                List.copyOf(cells.values()), results, List.copyOf(checks.values()), withoutValue, findings, sorted);
    }
}
