package sill.values;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a tolerance cell found of one number: the value of an expression, or one component of a record. All in coherent SI.
 *
 * @param cell number of the tolerance cell
 * @param index place of the expression in the cell, from 1
 * @param of the expression as written
 * @param component the component of a record; empty for a number
 * @param unit coherent SI unit symbol; empty when unknown
 * @param shownIn the unit that the caption of a studied variable asks for; empty when none
 * @param nominal what the cells gave
 * @param varied the givens that varied, in order
 * @param worstCase the extremes, when asked for
 * @param rootSumSquare the linear estimate, when asked for
 * @param monteCarlo what the samples gave, when asked for
 * @param sensitivities the largest share first
 * @param sweep the result along one given, when asked for
 * @param remarks what a reader must know of these figures, each a sentence
 */
public record Finding(
        int cell,
        int index,
        String of,
        String component,
        String unit,
        String shownIn,
        double nominal,
        List<String> varied,
        Optional<WorstCase> worstCase,
        Optional<RootSumSquare> rootSumSquare,
        Optional<MonteCarlo> monteCarlo,
        List<Sensitivity> sensitivities,
        Optional<Sweep> sweep,
        List<String> remarks) {
    public Finding {
        varied = List.copyOf(varied);
        sensitivities = List.copyOf(sensitivities);
        remarks = List.copyOf(remarks);
    }

    /** What it is called: {@code band}, {@code trip.rising}. */
    public String name() {
        return component.isEmpty() ? of : of + "." + component;
    }

    /** How a result moves with a given over the whole of its range, the others anywhere in theirs. */
    public enum Trend {
        RISING("rising"),
        FALLING("falling"),
        /** It does not move. */
        STILL("still"),
        /** It turns, or moves one way here and the other way there. */
        MIXED("mixed");

        private final String word;

        Trend(String word) {
            this.word = word;
        }

        /** The word in the record. */
        public String word() {
            return word;
        }
    }

    /** An extreme and the values of the varied givens, in their order, at which it was found. */
    public record Extreme(double value, List<Double> at) {
        public Extreme {
            at = List.copyOf(at);
        }
    }

    /** The extremes that were found, and how the result moves with each varied given. */
    public record WorstCase(Extreme low, Extreme high, List<Trend> trends) {
        public WorstCase {
            trends = List.copyOf(trends);
        }

        /** Whether the extremes must lie at limits of the givens. */
        public boolean isMonotonic() {
            return !trends.contains(Trend.MIXED);
        }
    }

    /**
     * The linear estimate.
     *
     * @param low nominal less the root of the sum of squares toward the low side
     * @param high nominal and that toward the high side
     * @param standardUncertainty JCGM 100:2008, 5.1.2, from each given's distribution
     */
    public record RootSumSquare(double low, double high, double standardUncertainty) {}

    /** How far a given moves the result: the slope at the nominal point, and its part of the variance, from 0 to 1. */
    public record Sensitivity(String given, double slope, double share) {}

    /**
     * What samples gave.
     *
     * @param low lower end of the shortest interval that holds 95 % of the samples
     * @param high its upper end
     * @param quantiles by probability, as text
     * @param errors standard errors by sampling, by the name of the figure: {@code mean}, {@code sd}, {@code low}, {@code high} and
     *     each probability
     * @param resolution quantiles and ends of the interval lie this near those of all samples sorted; 0 where they are those
     * @param notFinite samples that gave no finite number
     * @param thrown of these, samples that ended in an exception
     * @param shares of samples inside the limits of checks
     */
    public record MonteCarlo(
            int samples,
            long seed,
            double mean,
            double sd,
            double low,
            double high,
            Map<String, Double> quantiles,
            Map<String, Double> errors,
            double resolution,
            double min,
            double max,
            long notFinite,
            long thrown,
            Histogram histogram,
            List<Share> shares) {
        public MonteCarlo {
            shares = List.copyOf(shares);
        }
    }

    /** Counts of samples between edges at equal distances. */
    public record Histogram(double from, double to, List<Long> counts) {
        public Histogram {
            counts = List.copyOf(counts);
        }
    }

    /**
     * A result along one given, from its lower limit to its upper one: at its nominal value but for that given, and lowest and
     * highest with all others varying.
     */
    public record Sweep(String given, List<Double> at, List<Double> nominal, List<Double> low, List<Double> high) {
        public Sweep {
            at = List.copyOf(at);
            nominal = List.copyOf(nominal);
            low = List.copyOf(low);
            high = List.copyOf(high);
        }
    }

    /**
     * How many samples lie inside the limits of a check.
     *
     * @param line the check's line
     * @param share from 0 to 1
     * @param low its lower 95 % confidence bound, exact binomial
     */
    public record Share(int line, double share, double low) {}
}
