package sill.plot;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import sill.stdlib.Plot;

/**
 * What an axis spans, and where on it a value lies.
 *
 * @param low value at its start, in coherent SI
 * @param high value at its end, greater than {@code low}
 * @param scale how it divides its length; on a logarithmic one {@code low} is positive
 */
record AxisRange(double low, double high, Plot.Scale scale) {
    /** Beyond this a difference of two values could overflow. */
    private static final double LARGEST = 1e300;

    /** Smaller spans than this share of the values are rounding noise. */
    private static final double SMALLEST_SHARE = 1e-12;

    /** The range of a plot's axis: all curves and marks, with space around points and above and below lines. */
    static AxisRange of(Plot plot, Plot.Side side) {
        boolean across = side == Plot.Side.X;
        DoubleStream points =
                plot.curves().stream().flatMapToDouble(curve -> Arrays.stream(across ? curve.x() : curve.y()));
        DoubleStream lines =
                plot.marks().stream().filter(mark -> mark.side() == side).mapToDouble(Plot.Mark::at);
        boolean onEdge = across && plot.curves().stream().noneMatch(curve -> curve.style() == Plot.Style.POINTS);
        Plot.Axis axis = across ? plot.x() : plot.y();
        return around(DoubleStream.concat(points, lines), axis.scale(), onEdge ? 0 : 0.05);
    }

    /** Whether a scale can show a value. */
    static boolean shows(Plot.Scale scale, double value) {
        return scale == Plot.Scale.LINEAR ? Math.abs(value) <= LARGEST : value >= Double.MIN_NORMAL && value <= LARGEST;
    }

    /**
     * The range of all values that the scale can show.
     *
     * @param margin free space at each end as a share of the length
     */
    static AxisRange around(DoubleStream values, Plot.Scale scale, double margin) {
        var shown = values.filter(value -> shows(scale, value)).summaryStatistics();
        if (shown.getCount() == 0) {
            return scale == Plot.Scale.LINEAR ? new AxisRange(0, 1, scale) : new AxisRange(1, 10, scale);
        }
        double low = shown.getMin();
        double high = shown.getMax();
        if (scale == Plot.Scale.LOGARITHMIC) {
            double logLow = StrictMath.log10(low);
            double logHigh = StrictMath.log10(high);
            double space = logHigh - logLow < 1e-3 ? 0.2 : margin * (logHigh - logLow);
            return new AxisRange(
                    margin == 0 && space == 0 ? low : StrictMath.pow(10, logLow - space),
                    margin == 0 && space == 0 ? high : StrictMath.pow(10, logHigh + space),
                    scale);
        }
        double size = Math.max(Math.abs(low), Math.abs(high));
        if (high - low <= SMALLEST_SHARE * size || high - low < Double.MIN_NORMAL) {
            double space = size < Double.MIN_NORMAL ? 1 : 0.1 * size;
            return new AxisRange(low - space, high + space, scale);
        }
        double space = margin * (high - low);
        return new AxisRange(low - space, high + space, scale);
    }

    /** The place of a value that the scale can show: 0 at the start of the axis, 1 at its end. */
    double fraction(double value) {
        if (scale == Plot.Scale.LINEAR) {
            return (value - low) / (high - low);
        }
        double logLow = StrictMath.log10(low);
        return (StrictMath.log10(value) - logLow) / (StrictMath.log10(high) - logLow);
    }

    /** The greatest size on the axis. */
    double largest() {
        return Math.max(Math.abs(low), Math.abs(high));
    }

    /** How many powers of ten a logarithmic axis spans. */
    double decades() {
        return StrictMath.log10(high) - StrictMath.log10(low);
    }
}
