package sill.stdlib;

import java.util.List;

/**
 * What a plot shows, as plain data: worksheets make one with {@link Plots}, the record draws it. All numbers are in the
 * coherent SI unit that the axis names; the drawing chooses the prefix.
 *
 * @param title what the plot shows, in a few words
 * @param description the same for a reader who cannot see it: what runs over what, from where to where, what is marked
 * @param x the horizontal axis
 * @param y the vertical axis
 * @param curves at least one curve
 * @param marks straight lines at a value of one axis: limits, trip points
 */
public record Plot(String title, String description, Axis x, Axis y, List<Curve> curves, List<Mark> marks) {
    public Plot {
        curves = List.copyOf(curves);
        marks = List.copyOf(marks);
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
    public record Axis(String label, String unit, Scale scale) {}

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
        public Curve {
            x = x.clone();
            y = y.clone();
        }

        @Override
        public double[] x() {
            return x.clone();
        }

        @Override
        public double[] y() {
            return y.clone();
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
    public record Mark(Side side, double at, String label, Role role) {}
}
