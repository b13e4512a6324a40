package sill.study;

import java.util.function.LongConsumer;

/**
 * Looks at all corners of some inputs. Neighbouring corners differ in one input alone (a reflected binary code), so each
 * step also shows which way the results go with that input.
 */
final class CornerSweep {
    /** Corners of a task. */
    private static final int TASK = 4096;

    /** Looks at the clock of interruption after so many. */
    private static final int LOOK_UP = 255;

    private final Box box;
    private final double[] base;
    private final int[] free;
    private final int outputs;

    /**
     * Corners of the inputs {@code free}, at most 30, the others as in {@code base}.
     *
     * @param outputs how many outputs the model has
     */
    CornerSweep(Box box, double[] base, int[] free, int outputs) {
        this.box = box;
        this.base = base.clone();
        this.free = free.clone();
        this.outputs = outputs;
    }

    long corners() {
        return 1L << free.length;
    }

    /** Adds all corners to a tally. */
    void run(Crew crew, Tally into, LongConsumer done) throws InterruptedException {
        crew.run((corners() + TASK - 1) / TASK, this::some, found -> {
            into.add(found);
            done.accept(found.evaluations());
        });
    }

    private Tally some(long number, Probe probe) throws InterruptedException {
        Tally tally = new Tally(box.size(), outputs);
        long from = number * TASK;
        long to = Math.min(corners(), from + TASK);
        double[] point = base.clone();
        long code = from ^ from >>> 1;
        for (int bit = 0; bit < free.length; bit++) {
            set(point, bit, (code >>> bit & 1) != 0);
        }
        tally.look(probe, point);
        double[] before = new double[outputs];
        for (long corner = from + 1; corner < to; corner++) {
            if ((corner & LOOK_UP) == 0 && Thread.interrupted()) {
                throw new InterruptedException();
            }
            System.arraycopy(probe.outputs(), 0, before, 0, outputs);
            int bit = Long.numberOfTrailingZeros(corner);
            boolean up = ((corner ^ corner >>> 1) >>> bit & 1) != 0;
            set(point, bit, up);
            tally.look(probe, point);
            if (up) {
                tally.rose(free[bit], before, probe.outputs());
            } else {
                tally.rose(free[bit], probe.outputs(), before);
            }
        }
        return tally;
    }

    private void set(double[] point, int bit, boolean up) {
        point[free[bit]] = up ? box.high(free[bit]) : box.low(free[bit]);
    }
}
