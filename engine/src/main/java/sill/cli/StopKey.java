package sill.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import sill.worker.SheetRun;

/**
 * A stop from the keyboard ends a run at what it has: the process waits until the record of that is written. Nothing else is
 * begun after it.
 */
final class StopKey {
    private static final int LONGEST_WAIT_SECONDS = 20;

    private final CountDownLatch ended = new CountDownLatch(1);
    private volatile SheetRun running;
    private volatile boolean pressed;

    /** Watches from now on. */
    void watch() {
        Runtime.getRuntime().addShutdownHook(new Thread(this::press, "stop key"));
    }

    /** What to stop. */
    void running(SheetRun run) {
        running = run;
        if (pressed) {
            run.stop();
        }
    }

    boolean isPressed() {
        return pressed;
    }

    /** All is written. */
    void ended() {
        ended.countDown();
    }

    private void press() {
        pressed = true;
        SheetRun run = running;
        if (run == null) {
            return;
        }
        run.stop();
        try {
            ended.await(LONGEST_WAIT_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
