package sill.study;

import java.util.List;
import org.apache.commons.rng.core.source64.XoShiRo256PlusPlus;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * Draws of the inputs. Samples come in blocks of {@value #BLOCK}, and each block has a generator of its own, made from the
 * seed and the number of the block; so a block's draws are the same whichever thread makes them.
 *
 * <p>The generator is xoshiro256++ (Blackman and Vigna 2021), the fastest of those in Commons RNG without known
 * faults. Its state is filled by SplitMix64, as its authors advise, started at a mix of seed and number: of 2^256 states two
 * blocks don't come near each other, while its own jumps would have to be made one after another. Within a block the draws
 * go by chunks of {@value #CHUNK} samples, in a chunk input by input.
 *
 * <p>Uniform draws have 53 random bits. Triangular ones invert the distribution, with the square root alone. Normal ones are
 * McFarland's ziggurat; the library asks {@code Math.exp} there only whether to accept about one draw in a hundred, so a last
 * bit that differs between JVMs changes none of 10^8 samples but with a chance below 10^-7.
 */
final class Draws {
    static final int BLOCK = 4096;
    static final int CHUNK = 256;

    private static final long GOLDEN = 0x9E3779B97F4A7C15L;

    private final Varied[] inputs;

    Draws(List<Varied> inputs) {
        this.inputs = inputs.toArray(new Varied[0]);
    }

    /** The generator of a block. */
    static XoShiRo256PlusPlus generator(long seed, long block) {
        long state = mixed(seed + GOLDEN) ^ mixed(mixed(block + GOLDEN) + GOLDEN);
        long[] words = new long[4];
        for (int i = 0; i < words.length; i++) {
            state += GOLDEN;
            words[i] = mixed(state);
        }
        return new XoShiRo256PlusPlus(words[0], words[1], words[2], words[3]);
    }

    /** The output function of SplitMix64 (Steele, Lea, Flood 2014). */
    private static long mixed(long value) {
        long z = value;
        z = (z ^ z >>> 30) * 0xBF58476D1CE4E5B9L;
        z = (z ^ z >>> 27) * 0x94D049BB133111EBL;
        return z ^ z >>> 31;
    }

    /** Fills {@code count} samples, one after another, each with all inputs. */
    void fill(XoShiRo256PlusPlus generator, ZigguratSampler normals, double[] rows, int count) {
        for (int i = 0; i < inputs.length; i++) {
            Varied input = inputs[i];
            if (!input.free()) {
                held(rows, i, count, input.nominal());
            } else if (input.spread() instanceof Spread.Normal) {
                normal(normals, rows, i, count, input.nominal(), input.standardDeviation());
            } else if (input.spread() instanceof Spread.Triangular) {
                triangular(generator, rows, i, count, input);
            } else {
                uniform(generator, rows, i, count, input.low(), input.width());
            }
        }
    }

    private void held(double[] rows, int input, int count, double value) {
        int inRow = inputs.length;
        for (int at = input, end = count * inRow; at < end; at += inRow) {
            rows[at] = value;
        }
    }

    private void uniform(XoShiRo256PlusPlus generator, double[] rows, int input, int count, double low, double width) {
        int inRow = inputs.length;
        for (int at = input, end = count * inRow; at < end; at += inRow) {
            rows[at] = low + width * generator.nextDouble();
        }
    }

    private void normal(ZigguratSampler normals, double[] rows, int input, int count, double mean, double sd) {
        int inRow = inputs.length;
        for (int at = input, end = count * inRow; at < end; at += inRow) {
            rows[at] = mean + sd * normals.sample();
        }
    }

    private void triangular(XoShiRo256PlusPlus generator, double[] rows, int input, int count, Varied varied) {
        int inRow = inputs.length;
        double low = varied.low();
        double high = varied.high();
        double below = varied.nominal() - low;
        double above = high - varied.nominal();
        double width = varied.width();
        double share = below / width;
        for (int at = input, end = count * inRow; at < end; at += inRow) {
            double u = generator.nextDouble();
            rows[at] = u < share ? low + Math.sqrt(u * width * below) : high - Math.sqrt((1 - u) * width * above);
        }
    }
}
