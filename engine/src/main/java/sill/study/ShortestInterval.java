package sill.study;

import java.util.Arrays;

/**
 * The shortest interval that holds 95 % of samples: JCGM 101:2008 7.7 (clause from memory).
 *
 * @param low its lower end
 * @param high its upper end
 * @param rank rank of the lower end among the samples
 * @param span ranks from the lower to the upper end
 */
record ShortestInterval(double low, double high, double rank, double span) {
    private static final double PROBABILITY = 0.95;
    private static final int SLICES = 16;
    private static final int LEAST_IN_SLICE = 100;

    static ShortestInterval of(Ordered samples) {
        double span = Math.min(samples.count() - 1.0, Math.floor(PROBABILITY * samples.count() + 0.5));
        double rank = samples.closest(span);
        return new ShortestInterval(samples.atRank(rank), samples.atRank(rank + span), rank, span);
    }

    /**
     * How the ends scatter over 16 slices of the samples in the order drawn, for all {@code count} samples: the place of a
     * shortest interval settles with the cube root of the number of samples where the density is smooth (faster elsewhere),
     * so the scatter of the slices is divided by the cube root of how many slices make up the count. Sorts the slices.
     *
     * @param values samples in the order drawn; those not a number are passed over
     * @return errors of the lower and the upper end; not numbers where a slice would have less than 100 samples
     */
    static double[] errors(double[] values, long count) {
        int size = values.length / SLICES;
        if (size < LEAST_IN_SLICE) {
            return new double[] {Double.NaN, Double.NaN};
        }
        double[] low = new double[SLICES];
        double[] high = new double[SLICES];
        for (int i = 0; i < SLICES; i++) {
            double[] slice = Arrays.copyOfRange(values, i * size, (i + 1) * size);
            Arrays.sort(slice);
            System.arraycopy(slice, 0, values, i * size, size);
            int finite = finite(slice);
            if (finite < LEAST_IN_SLICE) {
                return new double[] {Double.NaN, Double.NaN};
            }
            ShortestInterval interval = of(new Sorted(slice, finite));
            low[i] = interval.low();
            high[i] = interval.high();
        }
        double shrink = StrictMath.cbrt((double) size / count);
        return new double[] {
            Moments.of(low, SLICES).standardDeviation().value() * shrink,
            Moments.of(high, SLICES).standardDeviation().value() * shrink
        };
    }

    /** How many of sorted values are numbers: those that are not stand last. */
    static int finite(double[] sorted) {
        int finite = sorted.length;
        while (finite > 0 && Double.isNaN(sorted[finite - 1])) {
            finite--;
        }
        return finite;
    }
}
