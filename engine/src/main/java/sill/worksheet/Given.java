package sill.worksheet;

import java.util.List;
import sill.units.Unit;

/**
 * One line of a given cell.
 *
 * @param name a Java identifier
 * @param line its line in the worksheet
 * @param column the column of its name
 * @param value what it is
 * @param remark text after {@code |}, empty when there is none
 */
public record Given(String name, int line, int column, Value value, String remark) {

    /** What a given can be. */
    public sealed interface Value {}

    /**
     * A number with its unit and, where stated, limits.
     *
     * @param nominal in coherent SI
     * @param unit as written; symbol {@code 1} when none was
     * @param tolerance as written
     * @param distribution how it spreads between its limits
     */
    public record Quantity(double nominal, Unit unit, Tolerance tolerance, Distribution distribution) implements Value {
        /** The lower limit in coherent SI; the nominal when no tolerance was stated. */
        public double low() {
            return tolerance.low(nominal);
        }

        /** The upper limit in coherent SI; the nominal when no tolerance was stated. */
        public double high() {
            return tolerance.high(nominal);
        }

        /** Whether limits were stated. */
        public boolean hasLimits() {
            return !(tolerance instanceof Tolerance.None);
        }
    }

    /**
     * A list of numbers: a {@code double[]} in the cells.
     *
     * @param values in coherent SI
     * @param unit as written; symbol {@code 1} when none was
     */
    public record Quantities(List<Double> values, Unit unit) implements Value {
        public Quantities {
            values = List.copyOf(values);
        }
    }

    /** A text in quotes: a {@code String} in the cells. */
    public record Text(String text) implements Value {}

    /** A data file: a {@code Table} in the cells. {@code path} as written, with {@code /} between folders. */
    public record DataFile(String path) implements Value {}

    /** How a tolerance was stated; a trial value keeps the statement, not the limits. */
    public sealed interface Tolerance {
        double low(double nominal);

        double high(double nominal);

        /** None stated. */
        record None() implements Tolerance {
            @Override
            public double low(double nominal) {
                return nominal;
            }

            @Override
            public double high(double nominal) {
                return nominal;
            }
        }

        /** {@code ± 5 %}: a fraction of the nominal's size. */
        record Relative(double fraction) implements Tolerance {
            @Override
            public double low(double nominal) {
                return Decimals.sum(nominal, Decimals.product(-fraction, Math.abs(nominal)));
            }

            @Override
            public double high(double nominal) {
                return Decimals.sum(nominal, Decimals.product(fraction, Math.abs(nominal)));
            }
        }

        /** {@code ± 3 mV}: a distance in coherent SI. */
        record Absolute(double distance) implements Tolerance {
            @Override
            public double low(double nominal) {
                return Decimals.sum(nominal, -distance);
            }

            @Override
            public double high(double nominal) {
                return Decimals.sum(nominal, distance);
            }
        }

        /** {@code [1.2 V .. 1.8 V]}: limits in coherent SI. */
        record Range(double from, double to) implements Tolerance {
            @Override
            public double low(double nominal) {
                return from;
            }

            @Override
            public double high(double nominal) {
                return to;
            }
        }
    }

    /** How a given spreads between its limits. */
    public sealed interface Distribution {
        /** Equally likely anywhere between the limits. */
        record Uniform() implements Distribution {}

        /** Normal about the nominal; the limits are {@code ±k} standard deviations. */
        record Normal(double k) implements Distribution {}

        /** Triangular with its mode at the nominal. */
        record Triangular() implements Distribution {}
    }
}
