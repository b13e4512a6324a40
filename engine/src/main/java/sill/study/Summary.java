package sill.study;

import java.util.ArrayList;
import java.util.List;

/** Figures from moments and samples in order. */
final class Summary {
    /** ±3 standard deviations of a normal spread, the ends of its middle 95 %, the median. */
    private static final double[] PROBABILITIES = {0.00135, 0.025, 0.5, 0.975, 0.99865};

    private static final int FEWEST_CLASSES = 8;
    private static final int MOST_CLASSES = 80;

    /** A picture reaches this many times the distance of the outer quantiles beyond each of them at most. */
    private static final double TAIL = 0.5;

    private final Moments moments;
    private final Ordered samples;

    Summary(Moments moments, Ordered samples) {
        this.moments = moments;
        this.samples = samples;
    }

    /**
     * The figures.
     *
     * @param endErrors sampling errors of the ends of the shortest interval; where not numbers, those of quantiles of the
     *     same rank are taken
     */
    Statistics statistics(double[] endErrors) {
        ShortestInterval interval = ShortestInterval.of(samples);
        double upper = interval.rank() + interval.span();
        List<Quantile> quantiles = new ArrayList<>();
        for (double probability : PROBABILITIES) {
            quantiles.add(new Quantile(probability, at(samples.rank(probability), error(probability))));
        }
        double lowError = Double.isNaN(endErrors[0]) ? error(probability(interval.rank())) : endErrors[0];
        double highError = Double.isNaN(endErrors[1]) ? error(probability(upper)) : endErrors[1];
        return new Statistics(
                moments.mean(),
                moments.standardDeviation(),
                at(interval.rank(), lowError),
                at(upper, highError),
                quantiles,
                moments.min(),
                moments.max(),
                histogram());
    }

    private Estimate at(double rank, double error) {
        return new Estimate(samples.atRank(rank), error, samples.resolution(rank));
    }

    private double probability(double rank) {
        return (rank - 0.5) / samples.count();
    }

    /**
     * Sampling error of a quantile without an assumption on the spread: half the distance of the quantiles one binomial
     * standard deviation to each side.
     */
    private double error(double probability) {
        double away = Math.sqrt(probability * (1 - probability) / samples.count());
        return (samples.quantile(probability + away) - samples.quantile(probability - away)) / 2;
    }

    private Histogram histogram() {
        double first = samples.quantile(PROBABILITIES[0]);
        double last = samples.quantile(PROBABILITIES[PROBABILITIES.length - 1]);
        double reach = TAIL * (last - first);
        double from = samples.snapped(Math.max(moments.min(), first - reach));
        double to = samples.snapped(Math.min(moments.max(), last + reach));
        int classes = (int) Math.max(
                FEWEST_CLASSES, Math.min(MOST_CLASSES, Math.rint(2 * StrictMath.cbrt((double) samples.count()))));
        List<Double> edges = new ArrayList<>();
        List<Long> counts = new ArrayList<>();
        edges.add(from);
        long below = samples.atMost(Math.nextDown(from));
        long before = below;
        for (int i = 1; i <= classes; i++) {
            double edge = i == classes ? to : samples.snapped(from + (to - from) * i / classes);
            long here = Math.max(before, samples.atMost(edge));
            edges.add(edge);
            counts.add(here - before);
            before = here;
        }
        return new Histogram(edges, counts, below, samples.count() - before);
    }
}
