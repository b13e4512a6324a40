package sill.study;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

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
    static final int SLICES = 16;
    private static final int LEAST_IN_SLICE = 100;

    static ShortestInterval of(Ordered samples) {
        double span = Math.min(samples.count() - 1.0, Math.floor(PROBABILITY * samples.count() + 0.5));
        double rank = samples.closest(span);
        return new ShortestInterval(samples.atRank(rank), samples.atRank(rank + span), rank, span);
    }

    /**
     * Sorts one of {@value #SLICES} slices of samples in the order drawn.
     *
     * @return its interval; none where it holds less than 100 samples that are numbers
     */
    static Optional<ShortestInterval> ofSlice(double[] values, int slice) {
        int size = values.length / SLICES;
        double[] sorted = Arrays.copyOfRange(values, slice * size, (slice + 1) * size);
        BucketSort.sort(sorted);
        System.arraycopy(sorted, 0, values, slice * size, size);
        int finite = finite(sorted);
        return finite < LEAST_IN_SLICE ? Optional.empty() : Optional.of(of(new Sorted(sorted, finite)));
    }

    /**
     * Sampling errors of the ends, from their scatter over the slices: the place of a shortest interval settles with the
     * cube root of the number of samples where the density is smooth (faster elsewhere), so the scatter is divided by the
     * cube root of how many times the samples exceed a slice.
     *
     * @param slices the intervals of all slices
     * @param times how many times the samples exceed a slice
     * @return errors of the lower and the upper end; not numbers where a slice has too few samples
     */
    static double[] errors(List<Optional<ShortestInterval>> slices, double times) {
        if (slices.stream().anyMatch(Optional::isEmpty)) {
            return new double[] {Double.NaN, Double.NaN};
        }
        double[] low = slices.stream().mapToDouble(slice -> slice.get().low()).toArray();
        double[] high = slices.stream().mapToDouble(slice -> slice.get().high()).toArray();
        double shrink = 1 / StrictMath.cbrt(times);
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
