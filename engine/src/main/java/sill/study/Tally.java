package sill.study;

import java.util.Arrays;
import java.util.Optional;

/**
 * What evaluations within the limits have shown so far: extremes with their points, directions, failures. An equal value
 * does not replace an extreme, so the first point in the order of the study stays.
 */
final class Tally {
    /** Differences below this fraction of the values are taken as rounding. */
    private static final double ROUNDING = 1e-13;

    private static final byte UP = 1;
    private static final byte DOWN = 2;

    private final int inputs;
    private final double[] lowest;
    private final double[] highest;
    private final double[][] lowPoint;
    private final double[][] highPoint;
    private final byte[][] ways;
    private final long[] notFinite;
    private long thrown;
    private Throwable first;
    private long evaluations;

    Tally(int inputs, int outputs) {
        this.inputs = inputs;
        lowest = new double[outputs];
        Arrays.fill(lowest, Double.POSITIVE_INFINITY);
        highest = new double[outputs];
        Arrays.fill(highest, Double.NEGATIVE_INFINITY);
        lowPoint = new double[outputs][];
        highPoint = new double[outputs][];
        ways = new byte[inputs][outputs];
        notFinite = new long[outputs];
    }

    /** Evaluates at a point and takes note. */
    void look(Probe probe, double[] point) throws InterruptedException {
        evaluations++;
        boolean calm = probe.evaluate(point, 0);
        double[] outputs = probe.outputs();
        if (!calm) {
            thrown++;
            if (first == null) {
                first = probe.thrown();
            }
            return;
        }
        for (int k = 0; k < outputs.length; k++) {
            double value = outputs[k];
            if (!Double.isFinite(value)) {
                notFinite[k]++;
                continue;
            }
            if (value < lowest[k]) {
                lowest[k] = value;
                lowPoint[k] = kept(lowPoint[k], point);
            }
            if (value > highest[k]) {
                highest[k] = value;
                highPoint[k] = kept(highPoint[k], point);
            }
        }
    }

    private static double[] kept(double[] before, double[] point) {
        if (before == null) {
            return point.clone();
        }
        System.arraycopy(point, 0, before, 0, point.length);
        return before;
    }

    /** Takes note of what happened to the outputs as one input alone rose. */
    void rose(int input, double[] before, double[] after) {
        byte[] way = ways[input];
        for (int k = 0; k < way.length; k++) {
            double change = after[k] - before[k];
            double rounding = ROUNDING * Math.max(Math.abs(after[k]), Math.abs(before[k]));
            if (change > rounding) {
                way[k] |= UP;
            } else if (change < -rounding) {
                way[k] |= DOWN;
            }
        }
    }

    /** Adds a tally that comes after this one. */
    void add(Tally later) {
        evaluations += later.evaluations;
        thrown += later.thrown;
        if (first == null) {
            first = later.first;
        }
        for (int k = 0; k < lowest.length; k++) {
            notFinite[k] += later.notFinite[k];
            if (later.lowest[k] < lowest[k]) {
                lowest[k] = later.lowest[k];
                lowPoint[k] = later.lowPoint[k];
            }
            if (later.highest[k] > highest[k]) {
                highest[k] = later.highest[k];
                highPoint[k] = later.highPoint[k];
            }
            for (int i = 0; i < inputs; i++) {
                ways[i][k] |= later.ways[i][k];
            }
        }
    }

    double lowest(int output) {
        return lowest[output];
    }

    double highest(int output) {
        return highest[output];
    }

    /** Where the lowest value was; there must have been a finite one. */
    double[] lowPoint(int output) {
        return lowPoint[output].clone();
    }

    double[] highPoint(int output) {
        return highPoint[output].clone();
    }

    Direction direction(int input, int output) {
        return Direction.values()[ways[input][output]];
    }

    long evaluations() {
        return evaluations;
    }

    Failures failures(int output) {
        return new Failures(notFinite[output], thrown, Optional.ofNullable(first));
    }
}
