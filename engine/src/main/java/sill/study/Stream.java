package sill.study;

import org.apache.commons.rng.core.source64.XoShiRo256PlusPlus;

/**
 * The random numbers of a block: Commons RNG's xoshiro256++, with loops that hold its state in registers, which halves what
 * a draw costs. They give what {@link #nextDouble} gives call by call.
 */
final class Stream extends XoShiRo256PlusPlus {
    /** One unit of 53 random bits. */
    private static final double UNIT = 0x1p-53;

    private static final int DROPPED = 11;
    private static final long GOLDEN = 0x9E3779B97F4A7C15L;

    private Stream(long[] words) {
        super(words[0], words[1], words[2], words[3]);
    }

    /** That of a block. */
    static Stream of(long seed, long block) {
        long state = mixed(seed + GOLDEN) ^ mixed(mixed(block + GOLDEN) + GOLDEN);
        long[] words = new long[4];
        for (int i = 0; i < words.length; i++) {
            state += GOLDEN;
            words[i] = mixed(state);
        }
        return new Stream(words);
    }

    /** The output function of SplitMix64 (Steele, Lea, Flood 2014). */
    private static long mixed(long value) {
        long z = value;
        z = (z ^ z >>> 30) * 0xBF58476D1CE4E5B9L;
        z = (z ^ z >>> 27) * 0x94D049BB133111EBL;
        return z ^ z >>> 31;
    }

    /** Puts low + width × (0 to 1) at {@code from}, {@code from + step} and so on below {@code end}. */
    void uniform(double[] into, int from, int step, int end, double low, double width) {
        long s0 = state0;
        long s1 = state1;
        long s2 = state2;
        long s3 = state3;
        for (int at = from; at < end; at += step) {
            long bits = Long.rotateLeft(s0 + s3, 23) + s0;
            long shifted = s1 << 17;
            s2 ^= s0;
            s3 ^= s1;
            s1 ^= s2;
            s0 ^= s3;
            s2 ^= shifted;
            s3 = Long.rotateLeft(s3, 45);
            into[at] = low + width * ((bits >>> DROPPED) * UNIT);
        }
        state0 = s0;
        state1 = s1;
        state2 = s2;
        state3 = s3;
    }
}
