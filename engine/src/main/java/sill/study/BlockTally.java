package sill.study;

import java.util.List;
import java.util.Optional;

/** What the samples of a block, or of many in their order, have shown but for their order of size. */
final class BlockTally {
    private final List<Studied> outputs;
    private final Moments[] moments;
    private final long[] missing;
    private final long[][] inside;
    private long thrown;
    private Throwable first;

    BlockTally(List<Studied> outputs) {
        this.outputs = outputs;
        moments = new Moments[outputs.size()];
        missing = new long[outputs.size()];
        inside = new long[outputs.size()][];
        for (int k = 0; k < moments.length; k++) {
            moments[k] = new Moments();
            inside[k] = new long[outputs.get(k).windows().size()];
        }
    }

    void threw(Throwable thrown) {
        this.thrown++;
        if (first == null) {
            first = thrown;
        }
    }

    /** Takes the finite values of an output. */
    void take(int output, double[] finite, int count, int samples) {
        moments[output] = Moments.of(finite, count);
        missing[output] = samples - count;
        for (int w = 0; w < inside[output].length; w++) {
            Window window = outputs.get(output).windows().get(w);
            inside[output][w] = inside(window.low(), window.high(), finite, count);
        }
    }

    private static int inside(double low, double high, double[] values, int count) {
        int inside = 0;
        for (int i = 0; i < count; i++) {
            double value = values[i];
            inside += value >= low && value <= high ? 1 : 0;
        }
        return inside;
    }

    /** Adds a later block. */
    void add(BlockTally later) {
        thrown += later.thrown;
        if (first == null) {
            first = later.first;
        }
        for (int k = 0; k < moments.length; k++) {
            moments[k].add(later.moments[k]);
            missing[k] += later.missing[k];
            for (int w = 0; w < inside[k].length; w++) {
                inside[k][w] += later.inside[k][w];
            }
        }
    }

    Moments moments(int output) {
        return moments[output];
    }

    Failures failures(int output) {
        return new Failures(missing[output] - thrown, thrown, Optional.ofNullable(first));
    }

    /** Shares of all samples. */
    List<Share> shares(int output, long samples) {
        List<Window> windows = outputs.get(output).windows();
        List<Share> shares = new java.util.ArrayList<>();
        for (int w = 0; w < windows.size(); w++) {
            long count = inside[output][w];
            shares.add(new Share(windows.get(w), count, (double) count / samples, BinomialBound.lower(count, samples)));
        }
        return shares;
    }
}
