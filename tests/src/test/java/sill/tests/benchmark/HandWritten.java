package sill.tests.benchmark;

import java.util.Arrays;
import org.apache.commons.rng.core.source64.XoShiRo256PlusPlus;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;

/**
 * What an engineer would write who has no engine: the calculations of {@link StudySheet} as plain loops, with the study's generator
 * and distributions, and all limits as literals.
 */
final class HandWritten {
    private static final double[] PROBABILITIES = {0.00135, 0.025, 0.5, 0.975, 0.99865};
    private static final int OUTPUTS = 3;
    private static final int RESISTORS = 16;

    private HandWritten() {}

    private static double triangular(XoShiRo256PlusPlus generator, double low, double mode, double high) {
        double u = generator.nextDouble();
        double width = high - low;
        return u < (mode - low) / width
                ? low + Math.sqrt(u * width * (mode - low))
                : high - Math.sqrt((1 - u) * width * (high - mode));
    }

    /**
     * Samples the trip points, keeps and sorts them.
     *
     * @return of each of the three results its mean, standard deviation, least, greatest and five quantiles
     */
    static double[][] tripPoints(int samples, long seed) {
        XoShiRo256PlusPlus generator = new XoShiRo256PlusPlus(seed, 2, 3, 4);
        ZigguratSampler normals = ZigguratSampler.NormalizedGaussian.of(generator);
        double[][] kept = new double[OUTPUTS][samples];
        for (int i = 0; i < samples; i++) {
            double vSupply = 14.25 + 1.5 * generator.nextDouble();
            double vRef = 6.076 + 0.248 * generator.nextDouble();
            double rIn = 21.78e3 + 0.44e3 * generator.nextDouble();
            double rFb = 465.3e3 + 9.4e3 * generator.nextDouble();
            double vDrop = triangular(generator, 0.6, 0.9, 1.2);
            double vLow = 0.4 * generator.nextDouble();
            double vOffset = 0.001 * normals.sample();
            double vHigh = vSupply - vDrop;
            double share = rIn / rFb;
            double vTap = vRef + vOffset;
            double rising = vTap * (1 + share) - vLow * share;
            double falling = vTap * (1 + share) - vHigh * share;
            kept[0][i] = rising;
            kept[1][i] = falling;
            kept[2][i] = rising - falling;
        }
        double[][] figures = new double[OUTPUTS][];
        for (int k = 0; k < OUTPUTS; k++) {
            figures[k] = figures(kept[k]);
        }
        return figures;
    }

    /** Two passes, for a sum of squares would lose the digits of a small spread about a large mean. */
    private static double[] figures(double[] values) {
        double sum = 0;
        for (double value : values) {
            sum += value;
        }
        double mean = sum / values.length;
        double squares = 0;
        for (double value : values) {
            squares += (value - mean) * (value - mean);
        }
        Arrays.sort(values);
        double[] figures = new double[4 + PROBABILITIES.length];
        figures[0] = mean;
        figures[1] = Math.sqrt(squares / (values.length - 1));
        figures[2] = values[0];
        figures[3] = values[values.length - 1];
        for (int i = 0; i < PROBABILITIES.length; i++) {
            figures[4 + i] = values[(int) (PROBABILITIES[i] * (values.length - 1))];
        }
        return figures;
    }

    /** Samples the trip points and only adds them: no loop that draws and calculates can do less. */
    static double[] tripPointSums(int samples, long seed) {
        XoShiRo256PlusPlus generator = new XoShiRo256PlusPlus(seed, 2, 3, 4);
        ZigguratSampler normals = ZigguratSampler.NormalizedGaussian.of(generator);
        double sumOfRising = 0;
        double sumOfFalling = 0;
        double sumOfBand = 0;
        for (int i = 0; i < samples; i++) {
            double vSupply = 14.25 + 1.5 * generator.nextDouble();
            double vRef = 6.076 + 0.248 * generator.nextDouble();
            double rIn = 21.78e3 + 0.44e3 * generator.nextDouble();
            double rFb = 465.3e3 + 9.4e3 * generator.nextDouble();
            double vDrop = triangular(generator, 0.6, 0.9, 1.2);
            double vLow = 0.4 * generator.nextDouble();
            double vOffset = 0.001 * normals.sample();
            double vHigh = vSupply - vDrop;
            double share = rIn / rFb;
            double vTap = vRef + vOffset;
            double rising = vTap * (1 + share) - vLow * share;
            double falling = vTap * (1 + share) - vHigh * share;
            sumOfRising += rising;
            sumOfFalling += falling;
            sumOfBand += rising - falling;
        }
        return new double[] {sumOfRising / samples, sumOfFalling / samples, sumOfBand / samples};
    }

    /** All corners of the dividers: least and greatest sum with their corners. */
    static double[] dividerCorners(double[] low, double[] high) {
        double[] r = new double[RESISTORS];
        double least = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        int leastAt = 0;
        int greatestAt = 0;
        for (int corner = 0; corner < 1 << RESISTORS; corner++) {
            for (int i = 0; i < RESISTORS; i++) {
                r[i] = (corner >> i & 1) == 0 ? low[i] : high[i];
            }
            double sum = 0;
            for (int i = 0; i < RESISTORS; i += 2) {
                sum += r[i] / (r[i] + r[i + 1]);
            }
            if (sum < least) {
                least = sum;
                leastAt = corner;
            }
            if (sum > greatest) {
                greatest = sum;
                greatestAt = corner;
            }
        }
        return new double[] {least, greatest, leastAt, greatestAt};
    }
}
