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
    private volatile int cell;
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
    public void begins(int cell) {
        this.cell = cell;
    }

    private synchronized void show() {
        shown = true;
        int now = cell;
        String what =
                now == 0 ? "compiling" : "cell " + now + " of " + captions.size() + " \"" + captions.get(now) + "\"";
        terminal.progress(what + ", " + TimeUnit.NANOSECONDS.toSeconds(System.nanoTime() - start) + " s");
    }

    @Override
    public synchronized void close() {
        timer.cancel();
        if (shown) {
            terminal.progress("");
        }
    }
}
