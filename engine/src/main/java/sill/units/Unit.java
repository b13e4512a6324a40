package sill.units;

import java.math.BigDecimal;
import java.math.MathContext;

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

    /**
     * Reads a unit symbol.
     *
     * <p>Products are written {@code V·s}, {@code V*s} or {@code V s}, quotients {@code V/s} and {@code W/(m·K)}, powers
     * {@code m²} or {@code m^2}, roots {@code √Hz} or {@code sqrt(Hz)}. A symbol is taken as a whole unit before it is taken
     * as a prefix with a unit: {@code min} is the minute, {@code ms} the millisecond. {@code °C} is a temperature when it
     * stands alone and a difference anywhere else.
     *
     * @param text the symbol, without spaces at its ends; {@code 1} for a pure number
     * @throws UnitException if the text is no unit symbol
     */
    public static Unit parse(String text) throws UnitException {
        return UnitParser.parse(text).toUnit();
    }

    /** Whether a text is a unit symbol. */
    public static boolean isUnit(String text) {
        try {
            UnitParser.parse(text);
            return true;
        } catch (UnitException e) {
            return false;
        }
    }

    /** The coherent SI unit of this dimension, such as {@code V} for {@code mV} and {@code K} for {@code °C}. */
    public Unit coherent() {
        return ofDimension(dimension);
    }

    /** The coherent SI unit of a dimension: factor 1, offset 0. */
    public static Unit ofDimension(Dimension dimension) {
        return new Unit(CoherentUnits.symbol(dimension), dimension, 1, 0);
    }

    /**
     * A number in this unit, in coherent SI. The decimal digits are what is converted, so that {@code 3 µV} gives the
     * {@code double} nearest to 3 × 10⁻⁶.
     */
    public double toSi(double number) {
        if (!Double.isFinite(number) || factor == 1 && offset == 0) {
            return number;
        }
        return toSi(BigDecimal.valueOf(number));
    }

    /** A decimal number in this unit, in coherent SI: the nearest {@code double}, infinite when out of range. */
    public double toSi(BigDecimal number) {
        return number.multiply(BigDecimal.valueOf(factor))
                .add(BigDecimal.valueOf(offset))
                .doubleValue();
    }

    /** A coherent SI value, in this unit. */
    public double fromSi(double si) {
        if (!Double.isFinite(si) || factor == 1 && offset == 0) {
            return si;
        }
        return exactFromSi(si).doubleValue();
    }

    /** A coherent SI value, in this unit, to 34 digits; the value must be finite. */
    BigDecimal exactFromSi(double si) {
        return BigDecimal.valueOf(si)
                .subtract(BigDecimal.valueOf(offset))
                .divide(BigDecimal.valueOf(factor), MathContext.DECIMAL128);
    }
}
