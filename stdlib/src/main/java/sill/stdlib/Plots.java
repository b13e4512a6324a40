package sill.stdlib;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;

/**
 * Makes plots. All values are in coherent SI, and so are the units named here; {@link Plot} has the methods that add
 * curves, limits and marks.
 */
public final class Plots {
    private static final int STEPS = 200;

    private Plots() {}

    /**
     * One quantity over another.
     *
     * @param title what the plot shows, in a few words
     * @param xLabel what the horizontal axis measures
     * @param xUnit its coherent SI unit symbol, {@code "1"} for a pure number
     * @param xs abscissas, one or more
     * @param yLabel what the vertical axis measures; also the curve's name
     * @param yUnit its coherent SI unit symbol
     * @param ys ordinates, as many; those not finite leave a gap
     * @return the plot
     * @throws IllegalArgumentException when a unit is not coherent, or the values are none or not as many
     */
    public static Plot line(
            String title,
            String xLabel,
            @Unit("?x") String xUnit,
            @Unit("?x") double[] xs,
            String yLabel,
            @Unit("?y") String yUnit,
            @Unit("?y") double[] ys) {
        return Plot.described(
                title,
                axis(xLabel, "xUnit", xUnit),
                axis(yLabel, "yUnit", yUnit),
                List.of(new Plot.Curve(yLabel, Plot.Style.LINE, false, xs, ys)),
                List.of());
    }

    /**
     * A function, computed at 201 evenly spaced abscissas.
     *
     * @param title what the plot shows, in a few words
     * @param xLabel what the horizontal axis measures
     * @param xUnit its coherent SI unit symbol
     * @param low first abscissa, finite
     * @param high last abscissa, above {@code low}
     * @param yLabel what the vertical axis measures; also the curve's name
     * @param yUnit its coherent SI unit symbol
     * @param function ordinate at an abscissa
     * @return the plot
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    public static Plot line(
            String title,
            String xLabel,
            @Unit("?x") String xUnit,
            @Unit("?x") double low,
            @Unit("?x") double high,
            String yLabel,
            @Unit("?y") String yUnit,
            @Unit("?x -> ?y") DoubleUnaryOperator function) {
        Arguments.below("low", low, "high", high, "");
        double[] xs = sampled(i -> low + (high - low) * (i / STEPS));
        xs[STEPS] = high;
        return line(title, xLabel, xUnit, xs, yLabel, yUnit, values(xs, function));
    }

    /**
     * A quantity over frequency, on a logarithmic axis, computed at 201 frequencies of even ratio.
     *
     * @param title what the plot shows, in a few words
     * @param low first frequency in Hz, above 0
     * @param high last frequency in Hz, above {@code low}
     * @param yLabel what the vertical axis measures; also the curve's name
     * @param yUnit its coherent SI unit symbol
     * @param function ordinate at a frequency in Hz
     * @return the plot
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    public static Plot response(
            String title,
            @Unit("Hz") double low,
            @Unit("Hz") double high,
            String yLabel,
            @Unit("?y") String yUnit,
            @Unit("Hz -> ?y") DoubleUnaryOperator function) {
        Arguments.positive("low", low, "Hz");
        Arguments.below("low", low, "high", high, "Hz");
        double[] xs = sampled(i -> low * StrictMath.pow(high / low, i / STEPS));
        xs[STEPS] = high;
        return line(title, "frequency", "Hz", xs, yLabel, yUnit, values(xs, function))
                .logX();
    }

    /**
     * The transfer loop of a comparator: its output over its input, with the way up and the way down and both trip points
     * marked. The loop is drawn one band beyond each trip point.
     *
     * @param title what the plot shows, in a few words
     * @param trip the trip points
     * @param vOutBelow output level in V with the input below both trip points: the low level of a non-inverting
     *     comparator, the high level of an inverting one
     * @param vOutAbove output level in V with the input above both, other than {@code vOutBelow}
     * @return the plot
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    public static Plot transfer(
            String title, TripPoints trip, @Unit("V") double vOutBelow, @Unit("V") double vOutAbove) {
        Arguments.finite("vOutBelow", vOutBelow, "V");
        Arguments.finite("vOutAbove", vOutAbove, "V");
        if (vOutBelow == vOutAbove) {
            throw Arguments.broken("vOutAbove", "other than vOutBelow (" + vOutBelow + " V)", vOutAbove, "V");
        }
        double margin = trip.band() > 0 ? trip.band() : 1;
        double left = trip.falling() - margin;
        double right = trip.rising() + margin;
        double[] up = {left, trip.rising(), trip.rising(), right};
        double[] down = {right, trip.falling(), trip.falling(), left};
        double[] upLevels = {vOutBelow, vOutBelow, vOutAbove, vOutAbove};
        double[] downLevels = {vOutAbove, vOutAbove, vOutBelow, vOutBelow};
        return Plot.described(
                        title,
                        new Plot.Axis("input", "V", Plot.Scale.LINEAR),
                        new Plot.Axis("output", "V", Plot.Scale.LINEAR),
                        List.of(
                                new Plot.Curve("input rising", Plot.Style.LINE, true, up, upLevels),
                                new Plot.Curve("input falling", Plot.Style.LINE, true, down, downLevels)),
                        List.of())
                .tripPointsX(trip);
    }

    /**
     * A signal over time; {@link Plot#curve} and {@link Plot#steps} add more of the same unit.
     *
     * @param title what the plot shows, in a few words
     * @param times times in s
     * @param label the signal's name
     * @param unit its coherent SI unit symbol
     * @param values the signal, as many values
     * @return the plot
     * @throws IllegalArgumentException when the unit is not coherent, or the values are none or not as many
     */
    public static Plot signals(
            String title, @Unit("s") double[] times, String label, @Unit("?") String unit, @Unit("?") double[] values) {
        return line(title, "time", "s", times, label, unit, values);
    }

    private static Plot.Axis axis(String label, String unitName, String unit) {
        return new Plot.Axis(label, CoherentUnit.checked(unitName, unit), Plot.Scale.LINEAR);
    }

    private static double[] sampled(DoubleUnaryOperator abscissa) {
        return IntStream.rangeClosed(0, STEPS).asDoubleStream().map(abscissa).toArray();
    }

    private static double[] values(double[] xs, DoubleUnaryOperator function) {
        return Arrays.stream(xs).map(function).toArray();
    }
}
