package sill.worker;

import java.io.IOException;
import java.time.Duration;
import java.util.Map;
import java.util.Optional;
import sill.sheet.Place;
import sill.values.RunResult;
import sill.worksheet.Worksheet;

/**
 * Runs a worksheet's Java in a worker and gathers what it gives. A cell that takes too long, or takes the worker down with it,
 * is stopped; a new worker then does the cells that do not rest on it. There is a result in any case.
 */
public final class SheetRun implements AutoCloseable {
    private static final String TOO_LONG = "Look for a loop without an end, or allow more with --time-limit.";
    private static final String REPORT = "Please report it with the worksheet.";

    private final Limits limits;
    private final Pace pace;
    private volatile WorkerProcess worker;
    private volatile boolean stopping;

    private SheetRun(Limits limits, Pace pace, WorkerProcess worker) {
        this.limits = limits;
        this.pace = pace;
        this.worker = worker;
    }

    /**
     * Starts a worker for a run to come.
     *
     * @throws IOException when no process can be started
     */
    public static SheetRun start(Limits limits, Pace pace) throws IOException {
        return new SheetRun(limits, pace, WorkerProcess.start(limits, pace));
    }

    /** The same run with another time limit; the memory of its first worker is given. */
    public SheetRun within(Limits others) {
        return new SheetRun(others, pace, worker);
    }

    /** What its workers are good at. */
    public Pace pace() {
        return pace;
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
            Optional<Gathered.Stop> stop =
                    work(JobWriter.job(worksheet, files, gathered.stopped()), gathered, progress);
            // A step that was stopped before is left out; were it named again, a further worker would not get further.
            again = stop.isPresent()
                    && !stopping
                    && stop.get().cell() > 0
                    && !gathered.stopped().contains(stop.get().place());
            stop.ifPresent(gathered::stop);
            if (again) {
                worker.close();
                worker = WorkerProcess.start(limits, pace);
            }
        }
        return gathered.result();
    }

    /** Ends the run, from another thread, at what it has so far. */
    public void stop() {
        stopping = true;
        worker.stop();
    }

    @Override
    public void close() {
        worker.close();
    }

    private Optional<Gathered.Stop> work(Job job, Gathered gathered, Progress progress)
            throws IOException, InterruptedException {
        Report.Begun at = new Report.Begun(0, new Place(1, 1));
        try {
            worker.send(job);
        } catch (IOException e) {
            // The worker is gone already: the next report says how.
        }
        long begun = System.nanoTime();
        while (true) {
            Duration limit = at.cell() == 0 ? limits.translationTime() : limits.cellTime();
            // What a cell says of its progress gives it no more time.
            Duration left = limit.minusNanos(System.nanoTime() - begun);
            WorkerProcess.Heard heard = worker.next(left.isNegative() ? Duration.ZERO : left);
            if (heard.timedOut()) {
                return Optional.of(Gathered.Stop.at(at, "it took longer than " + words(limit), TOO_LONG));
            }
            if (heard.end().isPresent()) {
                WorkerProcess.End end = heard.end().get();
                // While it translates no cell of the worksheet has run.
                boolean ours = at.cell() == 0 && end.fault();
                return Optional.of(Gathered.Stop.at(at, end.words(), ours ? REPORT : end.hint()));
            }
            Report report = heard.report().orElseThrow();
            if (report instanceof Report.Begun step) {
                at = step;
                begun = System.nanoTime();
                progress.begins(step.cell());
            } else if (report instanceof Report.Failed failed) {
                return Optional.of(Gathered.Stop.at(at, failed.what(), failed.hint()));
            } else if (report instanceof Report.Studied studied) {
                progress.studied(studied.done(), studied.total());
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
}
