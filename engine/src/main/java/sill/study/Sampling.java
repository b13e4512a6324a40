package sill.study;

/**
 * How Monte Carlo draws.
 *
 * @param samples how many, from 2 to 10^10
 * @param seed any number; another seed gives other draws
 */
public record Sampling(long samples, long seed) {
    private static final long MOST = 10_000_000_000L;

    public Sampling {
        if (!(samples >= 2 && samples <= MOST)) {
            throw new IllegalArgumentException("samples must be from 2 to " + MOST + ", got " + samples);
        }
    }
}
