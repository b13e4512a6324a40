package sill.worker;

import java.io.IOException;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import sill.sheet.Place;
import sill.values.CellRun;
import sill.values.CellState;
import sill.values.CheckValue;
import sill.values.Result;
import sill.values.RunResult;
import sill.worksheet.Cell;
import sill.worksheet.Problem;
import sill.worksheet.Worksheet;

/**
 * Runs a worksheet's Java in a worker and gathers what it gives. A cell that takes too long, or takes the worker down with it,
 * is stopped; a new worker then does the cells that do not rest on it. There is a result in any case.
 */
public final class SheetRun implements AutoCloseable {
    private final Limits limits;
    private WorkerProcess worker;

    private SheetRun(Limits limits, WorkerProcess worker) {
        this.limits = limits;
        this.worker = worker;
    }

    /**
     * Starts a worker for a run to come.
     *
     * @throws IOException when no process can be started
     */
    public static SheetRun start(Limits limits) throws IOException {
        return new SheetRun(limits, WorkerProcess.start(limits));
    }

    /**
     * Runs a worksheet.
     *
     * @param files data files by path
     * @throws IOException when no process can be started
     * @throws InterruptedException when the waiting thread is interrupted
     */
    public RunResult run(Worksheet worksheet, Map<String, byte[]> files, Progress progress)
            throws IOException, InterruptedException {
        Gathered gathered = new Gathered(worksheet);
        boolean again = true;
        while (again) {
            Optional<Stop> stop = work(JobWriter.job(worksheet, files, gathered.stopped()), gathered, progress);
            // A step that was stopped before is left out; were it named again, a further worker would not get further.
            again = stop.isPresent()
                    && stop.get().cell() > 0
                    && !gathered.stopped().contains(stop.get().place());
            stop.ifPresent(gathered::stop);
            if (again) {
                worker.close();
                worker = WorkerProcess.start(limits);
            }
        }
        return gathered.result();
    }

    @Override
    public void close() {
        worker.close();
    }

    /** Where and why a worker ended too early; cell 0 while it translated. */
    private record Stop(int cell, Place place, String reason) {}

    private Optional<Stop> work(Job job, Gathered gathered, Progress progress)
            throws IOException, InterruptedException {
        Report.Begun at = new Report.Begun(0, new Place(1, 1));
        try {
            worker.send(job);
        } catch (IOException e) {
            // The worker is gone already: the next report says how.
        }
        while (true) {
            WorkerProcess.Heard heard = worker.next(at.cell() == 0 ? limits.translationTime() : limits.cellTime());
            if (heard.timedOut()) {
                return Optional.of(new Stop(
                        at.cell(),
                        at.place(),
                        "took longer than " + words(at.cell() == 0 ? limits.translationTime() : limits.cellTime())));
            }
            if (heard.end().isPresent()) {
                return Optional.of(new Stop(
                        at.cell(),
                        at.place(),
                        "the worker was lost: " + heard.end().get()));
            }
            Report report = heard.report().orElseThrow();
            if (report instanceof Report.Begun begun) {
                at = begun;
                progress.begins(begun.cell());
            } else if (report instanceof Report.Failed failed) {
                return Optional.of(new Stop(0, at.place(), "internal error, please report it: " + failed.what()));
            } else {
                gathered.take(report);
                if (report instanceof Report.Finished) {
                    return Optional.empty();
                }
            }
        }
    }

    private static String words(Duration time) {
        return time.toMillis() % 1000 == 0 ? time.toSeconds() + " s" : time.toMillis() + " ms";
    }

    /** What the workers of a run gave, the first word on each cell and check. */
    private static final class Gathered {
        private final Map<Integer, CellRun> cells = new TreeMap<>();
        private final Map<Integer, String> captions = new HashMap<>();
        private final List<Result> results = new ArrayList<>();
        private final Map<Place, CheckValue> checks = new TreeMap<>();
        private final Set<Place> endedChecks = new HashSet<>();
        private final Set<Place> stopped = new LinkedHashSet<>();
        private final Set<Problem> problems = new LinkedHashSet<>();
        private final List<Integer> codeCells = new ArrayList<>();

        Gathered(Worksheet worksheet) {
            for (Cell cell : worksheet.cells()) {
                captions.put(cell.number(), cell.caption());
                if (cell instanceof Cell.Calculation) {
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
            } else if (report instanceof Report.CheckEnded ended) {
                if (endedChecks.add(ended.place())) {
                    ended.value().ifPresent(value -> checks.put(ended.place(), value));
                    problems.addAll(ended.problems());
                }
            } else if (report instanceof Report.Finished finished) {
                problems.addAll(finished.problems());
            }
        }

        void stop(Stop stop) {
            String what = stop.cell() == 0
                    ? "the worksheet's Java: compiling it " + stop.reason()
                    : "cell " + stop.cell() + " \"" + captions.get(stop.cell()) + "\" was stopped: " + stop.reason();
            problems.add(
                    Problem.error(stop.place().line(), stop.place().column(), stop.cell(), what, hint(stop.reason())));
            if (stop.cell() > 0) {
                stopped.add(stop.place());
                endedChecks.add(stop.place());
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

        private static String hint(String reason) {
            if (reason.startsWith("took longer")) {
                return "look for a loop without an end, or allow more with --time-limit";
            }
            return reason.contains("out of memory") ? "keep fewer values, or allow more with --memory" : "";
        }

        RunResult result() {
            results.sort(Comparator.comparingInt(Result::cell).thenComparingInt(Result::index));
            List<Problem> sorted = new ArrayList<>(problems);
            sorted.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
            return new RunResult(List.copyOf(cells.values()), results, List.copyOf(checks.values()), sorted);
        }
    }
}
