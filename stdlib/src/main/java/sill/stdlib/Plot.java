package sill.stdlib;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * What a plot shows, as plain data: worksheets make one with {@link Plots}, the record draws it. All numbers are in the
 * coherent SI unit that the axis names; the drawing chooses the prefix.
 *
 * <p>A plot never changes. Its methods give a copy with one thing more, and with the description to match:
 *
 * <pre>
 * Plots.line("Trip points over supply", "supply", "V", supply, "rising", "V", rising)
 *         .curve("falling", falling)
 *         .yLabel("trip point")
 *         .limit(4.9, "REQ-07")
 * </pre>
 *
 * @param title what the plot shows, in a few words
 * @param description the same for a reader who cannot see it: what runs over what, from where to where, what is marked
 * @param x the horizontal axis
 * @param y the vertical axis
 * @param curves at least one curve
 * @param marks straight lines at a value of one axis: limits, trip points
 */
public record Plot(String title, String description, Axis x, Axis y, List<Curve> curves, List<Mark> marks) {
    /**
     * A plot as given, description and all.
     *
     * @throws IllegalArgumentException when there is no curve, or a logarithmic axis meets a value that is not above 0
     */
    public Plot {
        curves = List.copyOf(curves);
        marks = List.copyOf(marks);
        if (curves.isEmpty()) {
            throw new IllegalArgumentException("curves must be one or more, got none");
        }
        for (Curve curve : curves) {
            x.check(curve.label(), curve.x);
            y.check(curve.label(), curve.y);
        }
        for (Mark mark : marks) {
            (mark.side() == Side.X ? x : y).check(mark.label(), mark.at());
        }
    }

    /** A plot that describes itself. */
    static Plot described(String title, Axis x, Axis y, List<Curve> curves, List<Mark> marks) {
        return new Plot(title, PlotDescription.of(x, y, curves, marks), x, y, curves, marks);
    }

    /**
     * Adds a curve over the same abscissas as the first.
     *
     * @param label its name in the key; unless {@link #yLabel} is said, the vertical axis is named after all curves
     * @param ys ordinates in the axis's unit, as many as the first curve has
     */
    public Plot curve(String label, double[] ys) {
        return with(new Curve(label, Style.LINE, false, curves.get(0).x, ys));
    }

    /**
     * Adds a curve computed at the abscissas of the first.
     *
     * @param label its name in the key
     * @param function ordinate at an abscissa, both in their axis's unit
     */
    public Plot curve(String label, DoubleUnaryOperator function) {
        return curve(label, Arrays.stream(curves.get(0).x).map(function).toArray());
    }

    /**
     * Adds a curve that keeps its level until the next abscissa, over those of the first curve: an output that switches.
     *
     * @param label its name in the key
     * @param ys ordinates in the axis's unit, as many as the first curve has
     */
    public Plot steps(String label, double[] ys) {
        return with(new Curve(label, Style.STEP, false, curves.get(0).x, ys));
    }

    /**
     * Adds points that no line joins: measurements.
     *
     * @param label their name in the key
     * @param xs abscissas in the axis's unit
     * @param ys ordinates in the axis's unit, as many
     */
    public Plot points(String label, double[] xs, double[] ys) {
        return with(new Curve(label, Style.POINTS, false, xs, ys));
    }

    /** Marks a requirement's limit on the vertical axis, as a horizontal line. */
    public Plot limit(double at, String label) {
        return with(new Mark(Side.Y, at, label, Role.LIMIT));
    }

    /** Marks a requirement's limit on the horizontal axis, as a vertical line. */
    public Plot limitX(double at, String label) {
        return with(new Mark(Side.X, at, label, Role.LIMIT));
    }

    /** Marks a nominal or other reference level on the vertical axis, as a horizontal line. */
    public Plot reference(double at, String label) {
        return with(new Mark(Side.Y, at, label, Role.REFERENCE));
    }

    /** Marks a nominal or other reference value on the horizontal axis, as a vertical line. */
    public Plot referenceX(double at, String label) {
        return with(new Mark(Side.X, at, label, Role.REFERENCE));
    }

    /** Marks both trip points on the vertical axis, as horizontal lines: for an input over time. */
    public Plot tripPoints(TripPoints trip) {
        return tripPoints(Side.Y, trip);
    }

    /** Marks both trip points on the horizontal axis, as vertical lines: for an output over input. */
    public Plot tripPointsX(TripPoints trip) {
        return tripPoints(Side.X, trip);
    }

    /** Names the vertical axis, for curves that measure one thing. */
    public Plot yLabel(String label) {
        return described(title, x, new Axis(label, y.unit(), y.scale()), curves, marks);
    }

    /** Divides the horizontal axis logarithmically; all abscissas must be above 0. */
    public Plot logX() {
        return described(title, new Axis(x.label(), x.unit(), Scale.LOGARITHMIC), y, curves, marks);
    }

    /** Divides the vertical axis logarithmically; all ordinates must be above 0. */
    public Plot logY() {
        return described(title, x, new Axis(y.label(), y.unit(), Scale.LOGARITHMIC), curves, marks);
    }

    private Plot tripPoints(Side side, TripPoints trip) {
        return with(new Mark(side, trip.rising(), "rising", Role.TRIP_POINT))
                .with(new Mark(side, trip.falling(), "falling", Role.TRIP_POINT));
    }

    private Plot with(Mark mark) {
        List<Mark> more = new ArrayList<>(marks);
        more.add(mark);
        return described(title, x, y, curves, more);
    }

    private Plot with(Curve curve) {
        List<Curve> more = new ArrayList<>(curves);
        more.add(curve);
        boolean namedAfterCurves = y.label().equals(labels(curves));
        Axis axis = namedAfterCurves ? new Axis(labels(more), y.unit(), y.scale()) : y;
        return described(title, x, axis, more, marks);
    }

    private static String labels(List<Curve> curves) {
        return String.join(", ", curves.stream().map(Curve::label).toList());
    }

    /** How an axis divides its length. */
    public enum Scale {
        LINEAR,
        LOGARITHMIC
    }

    /** How a curve joins its points. */
    public enum Style {
        /** Straight lines from point to point. */
        LINE,
        /** Horizontal until the next point, then straight up or down. */
        STEP,
        /** Points alone. */
        POINTS
    }

    /** Which axis a mark stands on: X is a vertical line, Y a horizontal one. */
    public enum Side {
        X,
        Y
    }

    /** What a mark means; it decides the look. */
    public enum Role {
        /** A requirement's limit. */
        LIMIT,
        /** A trip point. */
        TRIP_POINT,
        /** A nominal or other reference level. */
        REFERENCE
    }

    /**
     * An axis.
     *
     * @param label what it measures
     * @param unit coherent SI unit symbol, {@code "1"} for a pure number
     * @param scale how it divides its length
     */
    public record Axis(String label, String unit, Scale scale) {
        private void check(String what, double... values) {
            for (double value : values) {
                if (scale == Scale.LOGARITHMIC && value <= 0) {
                    String name = "\"" + what + "\" on the logarithmic axis \"" + label + "\"";
                    throw Arguments.broken(name, "above 0", value, unit.equals("1") ? "" : unit);
                }
            }
        }
    }

    /**
     * A curve; points that are not finite leave a gap.
     *
     * @param label its name in the key
     * @param style how points are joined
     * @param arrow whether its direction of travel is drawn
     * @param x abscissas, same length as {@code y}
     * @param y ordinates
     */
    public record Curve(String label, Style style, boolean arrow, double[] x, double[] y) {
        /**
         * A curve through copies of these points.
         *
         * @throws IllegalArgumentException when there is no point, or not as many ordinates as abscissas
         */
        public Curve {
            x = x.clone();
            y = y.clone();
            if (x.length == 0) {
                throw new IllegalArgumentException("curve \"" + label + "\" must have one point or more, got none");
            }
            if (x.length != y.length) {
                throw new IllegalArgumentException("curve \"" + label + "\" must have as many ordinates as abscissas ("
                        + x.length + "), got " + y.length);
            }
        }

        @Override
        public double[] x() {
            return x.clone();
        }

        @Override
        public double[] y() {
            return y.clone();
        }

        /** Two curves are equal when they draw the same. */
        @Override
        public boolean equals(Object other) {
            return other instanceof Curve curve
                    && label.equals(curve.label)
                    && style == curve.style
                    && arrow == curve.arrow
                    && Arrays.equals(x, curve.x)
                    && Arrays.equals(y, curve.y);
        }

        @Override
        public int hashCode() {
            return 31 * (31 * label.hashCode() + Arrays.hashCode(x)) + Arrays.hashCode(y);
        }

        @Override
        public String toString() {
            return "Curve[" + label + ", " + style + ", " + x.length + " points]";
        }
    }

    /**
     * A straight line across the plot.
     *
     * @param side which axis the value belongs to
     * @param at the value, in that axis's unit
     * @param label what it is
     * @param role what it means
     */
    public record Mark(Side side, double at, String label, Role role) {
        /**
         * A mark.
         *
         * @throws IllegalArgumentException when its value is not finite
         */
        public Mark {
            Arguments.finite("mark \"" + label + "\"", at, "");
        }
    }
}
