package sill.units;

/**
 * A unit of measurement: {@code si = number × factor + offset}.
 *
 * @param symbol as written, in SI spelling ({@code mV}, {@code nV/√Hz}); {@code 1} for a pure number
 * @param dimension what it measures
 * @param factor size in the coherent SI unit
 * @param offset zero point in the coherent SI unit; not 0 only for {@code °C}
 */
public record Unit(String symbol, Dimension dimension, double factor, double offset) {
    /** The unit of a pure number. */
    public static final Unit ONE = new Unit("1", Dimension.NONE, 1, 0);

    /** A number in this unit, in coherent SI. */
    public double toSi(double number) {
        return number * factor + offset;
    }

    /** A coherent SI value, in this unit. */
    public double fromSi(double si) {
        return (si - offset) / factor;
    }
}
