package sill.study;

/**
 * Samples counted in {@value #CELLS} cells of equal width, with one more cell to each side; stands for samples that are too
 * many to keep. Counts don't depend on the order in which samples come, so each thread may have a grid of its own.
 *
 * <p>A value asked for by rank lies in the cell in which the sample of that rank is. The grid is laid about samples that were
 * kept: over their 0.05 % and 99.95 % quantiles and as far again to each side, or over all of them where that is less.
 */
final class Grid implements Ordered {
    static final int CELLS = 1 << 18;
    private static final double TAIL = 0.0005;

    /** Beyond the kept samples, as a fraction of the width. */
    private static final double MARGIN = 1.0 / 64;

    private final double low;
    private final double cell;
    private final double perCell;
    private final long[] counts;
    private long[] cumulative = new long[0];
    private double min = Double.POSITIVE_INFINITY;
    private double max = Double.NEGATIVE_INFINITY;

    private Grid(double low, double cell) {
        this.low = low;
        this.cell = cell;
        this.perCell = 1 / cell;
        this.counts = new long[CELLS + 2];
    }

    /** A grid for samples like those sorted ones. */
    static Grid like(Ordered sorted) {
        double from = sorted.quantile(TAIL);
        double to = sorted.quantile(1 - TAIL);
        double least = sorted.atRank(1);
        double most = sorted.atRank(sorted.count());
        double width = to - from;
        double low = Math.max(least - MARGIN * width, from - width);
        double high = Math.min(most + MARGIN * width, to + width);
        // All but equal samples: cells that are still apart from each other.
        double finest = 16 * Math.max(Math.max(Math.ulp(low), Math.ulp(high)), Double.MIN_NORMAL);
        double cell = Math.max((high - low) / CELLS, finest);
        return new Grid(low, Math.min(cell, Double.MAX_VALUE));
    }

    /** Another one, empty, of the same cells. */
    Grid empty() {
        return new Grid(low, cell);
    }

    /** Counts the first {@code count} values, all finite. */
    void add(double[] values, int count) {
        double from = low;
        double scale = perCell;
        long[] cells = counts;
        for (int i = 0; i < count; i++) {
            double place = (values[i] - from) * scale;
            int index = place < 0 ? 0 : place >= CELLS ? CELLS + 1 : (int) place + 1;
            cells[index]++;
        }
    }

    /** Counts what another grid of the same cells has counted. */
    void add(Grid other) {
        for (int i = 0; i < counts.length; i++) {
            counts[i] += other.counts[i];
        }
    }

    /** Ends the counting. */
    void close(double lowest, double highest) {
        min = lowest;
        max = highest;
        cumulative = counts.clone();
        for (int i = 1; i < cumulative.length; i++) {
            cumulative[i] += cumulative[i - 1];
        }
    }

    @Override
    public long count() {
        return cumulative[CELLS + 1];
    }

    /** Lower edge of a cell, the outer ones included; the edge number {@code CELLS + 2} is the highest sample. */
    private double edge(int index) {
        if (index == 0) {
            return Math.min(min, low);
        } else if (index == CELLS + 2) {
            return Math.max(max, edge(CELLS + 1));
        }
        return low + (index - 1) * cell;
    }

    /** The cell that holds the sample of a rank. */
    private int cellOf(double rank) {
        int from = 0;
        int to = cumulative.length - 1;
        while (from < to) {
            int middle = from + to >>> 1;
            if (cumulative[middle] >= rank) {
                to = middle;
            } else {
                from = middle + 1;
            }
        }
        return from;
    }

    @Override
    public double atRank(double rank) {
        int index = cellOf(rank);
        double below = index == 0 ? 0 : cumulative[index - 1];
        double part = counts[index] == 0 ? 0 : (rank - below) / counts[index];
        double value = edge(index) + Math.max(0, Math.min(1, part)) * (edge(index + 1) - edge(index));
        return Math.max(min, Math.min(max, value));
    }

    @Override
    public long atMost(double value) {
        double place = Math.rint((value - low) * perCell);
        return place < 0 ? 0 : cumulative[(int) Math.min(place, CELLS)];
    }

    @Override
    public double snapped(double value) {
        double place = Math.max(0, Math.min(CELLS, Math.rint((value - low) * perCell)));
        return low + place * cell;
    }

    /** Looks from the lowest sample and from every cell that holds one. */
    @Override
    public double closest(double span) {
        double best = 1;
        double shortest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < cumulative.length; i++) {
            double rank = i == 0 ? 1 : cumulative[i - 1] + 1.0;
            if (rank + span > count()) {
                break;
            }
            if (i > 0 && counts[i] == 0) {
                continue;
            }
            double length = atRank(rank + span) - atRank(rank);
            if (length < shortest) {
                shortest = length;
                best = rank;
            }
        }
        return best;
    }

    @Override
    public double resolution(double rank) {
        int index = cellOf(rank);
        return edge(index + 1) - edge(index);
    }
}
