package sill.study;

import java.util.List;

/**
 * Figures of the finite samples.
 *
 * @param mean arithmetic mean
 * @param sd standard deviation (n − 1)
 * @param low lower end of the shortest 95 % interval (JCGM 101:2008 5.3.4 and 7.7)
 * @param high its upper end
 * @param quantiles at 0.00135, 0.025, 0.5, 0.975 and 0.99865
 * @param min the lowest sample
 * @param max the highest sample
 * @param histogram the samples in classes
 */
public record Statistics(
        Estimate mean,
        Estimate sd,
        Estimate low,
        Estimate high,
        List<Quantile> quantiles,
        double min,
        double max,
        Histogram histogram) {
    public Statistics {
        quantiles = List.copyOf(quantiles);
    }
}
