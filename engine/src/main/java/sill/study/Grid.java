package sill.study;

/**
 * Samples counted in cells; stands for samples that are too many to keep. Counts don't depend on the order in which samples
 * come, so each thread may have a grid of its own.
 *
 * <p>To each side of a centre, the median of samples that were kept, lie {@value #OCTAVES} octaves of {@value #IN_OCTAVE} cells
 * each: a cell is about a ten-thousandth of its distance from the centre wide, and its number is the upper bits of that
 * distance. The octaves reach out to the farthest kept sample, or to twice the distance of the 0.05 % quantile of that side
 * where that is less. One more cell to each side takes what lies beyond. A value asked for by rank lies in the cell in which
 * the sample of that rank is, so the width of the cell bounds its error; in it ranks go by a straight line.
 */
final class Grid implements Ordered {
    private static final int OCTAVES = 24;
    private static final int IN_OCTAVE = 1 << 13;

    /** Cells of a side. */
    private static final int SIDE = OCTAVES * IN_OCTAVE;

    /** What is left of a double's bits when its octave and its cell in the octave are kept. */
    private static final int DROPPED = 52 - 13;

    private static final double TAIL = 0.0005;

    /** Beyond the farthest kept sample, as a fraction of its distance. */
    private static final double MARGIN = 1.0 / 64;

    private final double centre;
    private final long baseBelow;
    private final long baseAbove;
    private final long[] counts = new long[2 * SIDE + 2];
    private long[] cumulative = new long[0];
    private double min = Double.POSITIVE_INFINITY;
    private double max = Double.NEGATIVE_INFINITY;

    private Grid(double centre, long baseBelow, long baseAbove) {
        this.centre = centre;
        this.baseBelow = baseBelow;
        this.baseAbove = baseAbove;
    }

    /** A grid for samples like those sorted ones. */
    static Grid like(Ordered sorted) {
        double centre = sorted.quantile(0.5);
        double below = Math.min(2 * (centre - sorted.quantile(TAIL)), (1 + MARGIN) * (centre - sorted.atRank(1)));
        double above = Math.min(
                2 * (sorted.quantile(1 - TAIL) - centre), (1 + MARGIN) * (sorted.atRank(sorted.count()) - centre));
        return new Grid(centre, base(below, centre), base(above, centre));
    }

    /** The number before the first cell of a side that reaches out so far. */
    private static long base(double reach, double centre) {
        // Cells are no finer than what tells doubles at the centre apart.
        double least = Math.max(Math.ulp(centre), Double.MIN_NORMAL) * (1 << OCTAVES);
        double most = Double.MAX_VALUE / 4;
        int exponent = Math.getExponent(Math.min(most, Math.max(least, reach)));
        return (long) (exponent - OCTAVES + 1 + Double.MAX_EXPONENT) * IN_OCTAVE;
    }

    /** Another one, empty, of the same cells. */
    Grid empty() {
        return new Grid(centre, baseBelow, baseAbove);
    }

    /** Counts the first {@code count} values, all finite. */
    void add(double[] values, int count) {
        double middle = centre;
        long below = baseBelow;
        long above = baseAbove;
        long[] cells = counts;
        for (int i = 0; i < count; i++) {
            long bits = Double.doubleToRawLongBits(values[i] - middle);
            // All ones below the centre, else 0: a branch would be foretold wrong every other time.
            long sign = bits >> 63;
            long key = ((bits & Long.MAX_VALUE) >>> DROPPED) - above + ((above - below) & sign);
            long cell = Math.max(0, Math.min(SIDE, key));
            cells[SIDE + 1 + (int) (cell ^ sign)]++;
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
        return cumulative[cumulative.length - 1];
    }

    /** Lower edge of a cell; that of the cell after the last is the highest sample. */
    private double edge(int index) {
        if (index == 0) {
            return Math.min(min, edge(1));
        } else if (index == counts.length) {
            return Math.max(max, edge(index - 1));
        } else if (index == SIDE + 1) {
            return centre;
        }
        return index <= SIDE
                ? centre - distance(baseBelow + SIDE + 1 - index)
                : centre + distance(baseAbove + index - SIDE - 1);
    }

    private static double distance(long key) {
        return Double.longBitsToDouble(key << DROPPED);
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
        return inCell(cellOf(rank), rank);
    }

    private double inCell(int index, double rank) {
        double below = index == 0 ? 0 : cumulative[index - 1];
        double part = counts[index] == 0 ? 0 : (rank - below) / counts[index];
        double value = edge(index) + Math.max(0, Math.min(1, part)) * (edge(index + 1) - edge(index));
        return Math.max(min, Math.min(max, value));
    }

    /** The first edge that is not below a value. */
    private int edgeFrom(double value) {
        int from = 0;
        int to = counts.length;
        while (from < to) {
            int middle = from + to >>> 1;
            if (edge(middle) >= value) {
                to = middle;
            } else {
                from = middle + 1;
            }
        }
        return from;
    }

    @Override
    public long atMost(double value) {
        int index = edgeFrom(value);
        return index == 0 ? 0 : cumulative[index - 1];
    }

    @Override
    public double snapped(double value) {
        int index = edgeFrom(value);
        double up = edge(index);
        double down = edge(Math.max(0, index - 1));
        return up - value <= value - down ? up : down;
    }

    /** Looks from the first sample of every cell. */
    @Override
    public double closest(double span) {
        double best = 1;
        double shortest = Double.POSITIVE_INFINITY;
        int upper = 0;
        for (int i = 0; i < cumulative.length; i++) {
            double rank = i == 0 ? 1 : cumulative[i - 1] + 1.0;
            if (rank + span > count()) {
                break;
            }
            if (counts[i] == 0) {
                continue;
            }
            while (cumulative[upper] < rank + span) {
                upper++;
            }
            double length = inCell(upper, rank + span) - inCell(i, rank);
            if (length < shortest) {
                shortest = length;
                best = rank;
            }
        }
        return best;
    }

    /** Between whole ranks both neighbours count. */
    @Override
    public double resolution(double rank) {
        return edge(cellOf(Math.ceil(rank)) + 1) - edge(cellOf(Math.floor(rank)));
    }
}
