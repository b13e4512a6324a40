package sill.cli;

import java.util.HashMap;
import java.util.Map;
import java.util.Timer;
import java.util.TimerTask;
import java.util.concurrent.TimeUnit;
import sill.worker.Progress;
import sill.worksheet.Cell;
import sill.worksheet.Worksheet;

/** Shows what a run is at, once it has taken longer than a second. */
final class RunProgress implements Progress, AutoCloseable {
    private static final long SHOWN_AFTER_MILLIS = 1000;
    private static final long RENEWED_AFTER_MILLIS = 250;

    private final Terminal terminal;
    private final Map<Integer, String> captions = new HashMap<>();
    private final Timer timer = new Timer("progress", true);
    private final long start = System.nanoTime();
    private int cell;
    private long cellStart = start;
    private long done;
    private long total;
    private boolean shown;

    RunProgress(Terminal terminal, Worksheet worksheet) {
        this.terminal = terminal;
        for (Cell each : worksheet.cells()) {
            captions.put(each.number(), each.caption());
        }
        TimerTask task = new TimerTask() {
            @Override
            public void run() {
                show();
            }
        };
        timer.schedule(task, SHOWN_AFTER_MILLIS, RENEWED_AFTER_MILLIS);
    }

    @Override
    public synchronized void begins(int cell) {
        this.cell = cell;
        cellStart = System.nanoTime();
        done = 0;
    }

    @Override
    public synchronized void studied(long done, long total) {
        this.done = done;
        this.total = total;
    }

    private synchronized void show() {
        shown = true;
        long now = System.nanoTime();
        String what =
                cell == 0 ? "compiling" : "cell " + cell + " of " + captions.size() + " \"" + captions.get(cell) + "\"";
        terminal.progress(what + ", " + seconds(now - start) + " s" + toGo(now));
    }

    /** How much of a tolerance cell is done, and when the rest will be, at the pace so far. */
    private String toGo(long now) {
        if (done == 0 || done >= total) {
            return "";
        }
        double left = (double) (total - done) / done * (now - cellStart);
        return ", " + done * 100 / total + " % of its repetitions, about " + (seconds((long) left) + 1) + " s to go";
    }

    private static long seconds(long nanoseconds) {
        return TimeUnit.NANOSECONDS.toSeconds(nanoseconds);
    }

    @Override
    public synchronized void close() {
        timer.cancel();
        if (shown) {
            terminal.progress("");
        }
    }
}
