package sill.study;

/** How a varied input spreads between, or about, its limits. */
public sealed interface Spread {
    /** Any value between the limits is as likely as any other. */
    record Uniform() implements Spread {}

    /**
     * Normal about the nominal value, not truncated at the limits.
     *
     * @param k how many standard deviations each limit lies from the nominal value, above 0
     */
    record Normal(double k) implements Spread {
        public Normal {
            if (!(k > 0 && k < Double.POSITIVE_INFINITY)) {
                throw new IllegalArgumentException("k must be finite and above 0, got " + k);
            }
        }
    }

    /** Triangular between the limits with the mode at the nominal value, which need not be in the middle. */
    record Triangular() implements Spread {}
}
