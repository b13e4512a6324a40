package sill.study;

/** Samples that were kept and sorted. */
final class Sorted implements Ordered {
    private final double[] values;
    private final int count;

    /** The first {@code count} values, sorted already. */
    Sorted(double[] values, int count) {
        this.values = values;
        this.count = count;
    }

    @Override
    public long count() {
        return count;
    }

    @Override
    public double atRank(double rank) {
        int below = Math.max(1, Math.min(count, (int) rank));
        double value = values[below - 1];
        if (below == count || rank <= below) {
            return value;
        }
        return value + (rank - below) * (values[below] - value);
    }

    @Override
    public long atMost(double value) {
        int from = 0;
        int to = count;
        while (from < to) {
            int middle = from + to >>> 1;
            if (values[middle] <= value) {
                from = middle + 1;
            } else {
                to = middle;
            }
        }
        return from;
    }

    @Override
    public double snapped(double value) {
        return value;
    }

    @Override
    public double closest(double span) {
        int step = (int) span;
        int best = 0;
        double shortest = Double.POSITIVE_INFINITY;
        for (int i = 0; i + step < count; i++) {
            double length = values[i + step] - values[i];
            if (length < shortest) {
                shortest = length;
                best = i;
            }
        }
        return best + 1;
    }

    @Override
    public double resolution(double rank) {
        return 0;
    }
}
