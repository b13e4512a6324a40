package sill.study;

import java.util.List;
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

    private final Varied[] inputs;

    Draws(List<Varied> inputs) {
        this.inputs = inputs.toArray(new Varied[0]);
    }

    /** Fills {@code count} samples, one after another, each with all inputs. */
    void fill(Stream generator, ZigguratSampler.NormalizedGaussian normals, double[] rows, int count) {
        for (int i = 0; i < inputs.length; i++) {
            Varied input = inputs[i];
            if (!input.free()) {
                held(rows, i, count, input.nominal());
            } else if (input.spread() instanceof Spread.Normal) {
                normal(normals, rows, i, count, input.nominal(), input.standardDeviation());
            } else if (input.spread() instanceof Spread.Triangular) {
                triangular(generator, rows, i, count, input);
            } else {
                generator.uniform(rows, i, inputs.length, count * inputs.length, input.low(), input.width());
            }
        }
    }

    private void held(double[] rows, int input, int count, double value) {
        int inRow = inputs.length;
        for (int at = input, end = count * inRow; at < end; at += inRow) {
            rows[at] = value;
        }
    }

    private void normal(
            ZigguratSampler.NormalizedGaussian normals, double[] rows, int input, int count, double mean, double sd) {
        int inRow = inputs.length;
        for (int at = input, end = count * inRow; at < end; at += inRow) {
            rows[at] = mean + sd * normals.sample();
        }
    }

    /** Both sides of the mode by one path, for a branch would be foretold wrong every other time. */
    private void triangular(Stream generator, double[] rows, int input, int count, Varied varied) {
        int inRow = inputs.length;
        int end = count * inRow;
        generator.uniform(rows, input, inRow, end, 0, 1);
        double below = varied.nominal() - varied.low();
        double above = varied.high() - varied.nominal();
        double share = below / varied.width();
        double[] limit = {varied.high(), varied.low()};
        double[] sign = {-1, 1};
        double[] area = {varied.width() * above, varied.width() * below};
        double[] start = {1, 0};
        for (int at = input; at < end; at += inRow) {
            double u = rows[at];
            int side = (int) (Double.doubleToRawLongBits(u - share) >>> 63);
            rows[at] = limit[side] + sign[side] * Math.sqrt((start[side] + sign[side] * u) * area[side]);
        }
    }
}
