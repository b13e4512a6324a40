package sill.study;

/**
 * Mean and central moments of finite values: of a block about its first value, then put together block by block (Chan,
 * Golub and LeVeque 1979; for the higher moments Pébay 2008). The order of the blocks is part of the result. The mean is kept as
 * its distance from the first of all values, so that a large mean with a small spread costs no digits.
 */
final class Moments {
    private long count;
    private double shift;
    private double offset;
    private double second;
    private double third;
    private double fourth;
    private double min = Double.POSITIVE_INFINITY;
    private double max = Double.NEGATIVE_INFINITY;

    /** Of the first {@code count} values, all finite. */
    static Moments of(double[] values, int count) {
        Moments moments = new Moments();
        if (count == 0) {
            return moments;
        }
        double shift = values[0];
        double sum = 0;
        double min = shift;
        double max = shift;
        for (int i = 0; i < count; i++) {
            double value = values[i];
            sum += value - shift;
            min = value < min ? value : min;
            max = value > max ? value : max;
        }
        double mean = sum / count;
        double rest = 0;
        double second = 0;
        double third = 0;
        double fourth = 0;
        for (int i = 0; i < count; i++) {
            double away = values[i] - shift - mean;
            double square = away * away;
            rest += away;
            second += square;
            third += square * away;
            fourth += square * square;
        }
        moments.count = count;
        // What the first pass lost to rounding, the second sees.
        moments.shift = shift;
        moments.offset = mean + rest / count;
        moments.second = Math.max(0, second - rest * rest / count);
        moments.third = third;
        moments.fourth = fourth;
        moments.min = min;
        moments.max = max;
        return moments;
    }

    /** Adds those of a later block. */
    void add(Moments later) {
        if (later.count == 0) {
            return;
        }
        double n1 = count;
        double n2 = later.count;
        double n = n1 + n2;
        if (count == 0) {
            shift = later.shift;
            offset = later.offset;
        }
        double delta = later.shift - shift + (later.offset - offset);
        double part = delta / n;
        double cross = delta * part * n1 * n2;
        fourth += later.fourth
                + cross * part * part * (n1 * n1 - n1 * n2 + n2 * n2)
                + 6 * part * part * (n1 * n1 * later.second + n2 * n2 * second)
                + 4 * part * (n1 * later.third - n2 * third);
        third += later.third + cross * part * (n1 - n2) + 3 * part * (n1 * later.second - n2 * second);
        second += later.second + cross;
        offset += part * n2;
        count += later.count;
        min = Math.min(min, later.min);
        max = Math.max(max, later.max);
    }

    long count() {
        return count;
    }

    double min() {
        return min;
    }

    double max() {
        return max;
    }

    /** The mean with its sampling error. */
    Estimate mean() {
        return new Estimate(shift + offset, Math.sqrt(second / (count - 1) / count), 0);
    }

    /**
     * The standard deviation (n − 1); its sampling error from the fourth moment, var(s²) = (m₄ − m₂² (n − 3) / (n − 1)) / n.
     */
    Estimate standardDeviation() {
        double variance = second / (count - 1);
        double ofVariance = (fourth / count - variance * variance * (count - 3) / (count - 1)) / count;
        double sd = Math.sqrt(variance);
        return new Estimate(sd, sd > 0 ? Math.sqrt(Math.max(0, ofVariance)) / (2 * sd) : 0, 0);
    }
}
