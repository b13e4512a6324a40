package sill.study;

import org.apache.commons.math3.distribution.BetaDistribution;

/** Confidence in a share. */
final class BinomialBound {
    private static final double RISK = 0.05;

    private BinomialBound() {}

    /**
     * The lower 95 % confidence bound (one-sided) of the share behind {@code inside} of {@code samples}, exact binomial:
     * Clopper and Pearson (1934), as a quantile of a beta distribution. The library's functions are Java throughout, so the
     * bound has the same bits on any JVM.
     */
    static double lower(long inside, long samples) {
        if (inside == 0) {
            return 0;
        } else if (inside == samples) {
            return StrictMath.pow(RISK, 1.0 / samples);
        }
        return new BetaDistribution(null, inside, samples - inside + 1.0, 1e-14).inverseCumulativeProbability(RISK);
    }
}
