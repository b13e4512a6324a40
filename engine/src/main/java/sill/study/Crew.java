package sill.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

/**
 * Threads that share numbered tasks, each with a probe of its own. What the tasks give is taken in the order of their
 * numbers, whichever thread ends first, so that it does not depend on how many threads there are.
 */
final class Crew {
    private final List<Probe> probes;

    Crew(List<Probe> probes) {
        this.probes = List.copyOf(probes);
    }

    /** One piece of work. */
    @FunctionalInterface
    interface Task<R> {
        /** Does it; long ones look at {@link Thread#interrupted} now and then. */
        R run(long number, Probe probe) throws InterruptedException;
    }

    List<Probe> probes() {
        return probes;
    }

    /** The probe of the calling thread. */
    Probe probe() {
        return probes.get(0);
    }

    /**
     * Runs the tasks 0 to {@code tasks} − 1.
     *
     * @param inOrder takes what each gave, one at a time
     * @throws InterruptedException when the calling thread is interrupted; all threads have ended by then
     */
    <R> void run(long tasks, Task<R> task, Consumer<R> inOrder) throws InterruptedException {
        Shift<R> shift = new Shift<>(tasks, task, inOrder);
        List<Thread> helpers = new ArrayList<>();
        for (int i = 1; i < Math.min(probes.size(), tasks); i++) {
            Probe probe = probes.get(i);
            Thread helper = new Thread(() -> shift.work(probe), "sill-study-" + i);
            helper.setDaemon(true);
            helper.setContextClassLoader(Thread.currentThread().getContextClassLoader());
            helpers.add(helper);
        }
        helpers.forEach(Thread::start);
        shift.work(probe());
        boolean stopped = shift.failed();
        for (Thread helper : helpers) {
            for (boolean ended = false; !ended; ) {
                if (stopped) {
                    helper.interrupt();
                }
                try {
                    helper.join();
                    ended = true;
                } catch (InterruptedException e) {
                    shift.fail(e);
                    stopped = true;
                }
            }
        }
        shift.finish();
    }

    private static final class Shift<R> {
        private final long tasks;
        private final Task<R> task;
        private final Consumer<R> inOrder;
        private final Map<Long, R> waiting = new HashMap<>();
        private Throwable failure;
        private long next;
        private long due;

        Shift(long tasks, Task<R> task, Consumer<R> inOrder) {
            this.tasks = tasks;
            this.task = task;
            this.inOrder = inOrder;
        }

        void work(Probe probe) {
            try {
                probe.settle();
                for (long number = take(); number < tasks; number = take()) {
                    if (Thread.interrupted()) {
                        throw new InterruptedException();
                    }
                    deliver(number, task.run(number, probe));
                }
            } catch (Throwable e) {
                fail(e);
            }
        }

        private synchronized long take() {
            return failure == null ? next++ : tasks;
        }

        private synchronized void deliver(long number, R result) {
            waiting.put(number, result);
            while (waiting.containsKey(due)) {
                inOrder.accept(waiting.remove(due));
                due++;
            }
        }

        synchronized void fail(Throwable e) {
            if (failure == null) {
                failure = e;
            }
        }

        synchronized boolean failed() {
            return failure != null;
        }

        synchronized void finish() throws InterruptedException {
            if (failure instanceof InterruptedException e) {
                throw e;
            } else if (failure instanceof Error e) {
                throw e;
            } else if (failure instanceof RuntimeException e) {
                throw e;
            }
        }
    }
}
