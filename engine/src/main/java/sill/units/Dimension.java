package sill.units;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * What a quantity measures: the exponents of the seven SI base units (SI brochure, 9th edition, 2.3.3). A voltage is
 * {@code kg·m²·s⁻³·A⁻¹}; a noise density has a half among its exponents. Angles are pure numbers.
 *
 * <p>Every operation throws {@link ArithmeticException} if an exponent leaves the range of {@link Rational}.
 */
public final class Dimension {
    /** The dimension of a pure number. */
    public static final Dimension NONE = new Dimension(Collections.nCopies(BaseUnit.values().length, Rational.ZERO));

    private final List<Rational> exponents;

    private Dimension(List<Rational> exponents) {
        this.exponents = exponents;
    }

    /** The dimension of a base unit. */
    public static Dimension of(BaseUnit unit) {
        List<Rational> exponents = new ArrayList<>(NONE.exponents);
        exponents.set(unit.ordinal(), Rational.ONE);
        return new Dimension(List.copyOf(exponents));
    }

    /** The exponent of a base unit. */
    public Rational exponent(BaseUnit unit) {
        return exponents.get(unit.ordinal());
    }

    /** The dimension of a product. */
    public Dimension times(Dimension other) {
        List<Rational> sums = new ArrayList<>(exponents.size());
        for (int i = 0; i < exponents.size(); i++) {
            sums.add(exponents.get(i).plus(other.exponents.get(i)));
        }
        return new Dimension(List.copyOf(sums));
    }

    /** The dimension of a quotient. */
    public Dimension over(Dimension other) {
        return times(other.power(Rational.of(-1)));
    }

    /** The dimension of a power; a root is a power with a fraction for its exponent. */
    public Dimension power(Rational exponent) {
        List<Rational> products = new ArrayList<>(exponents.size());
        for (Rational own : exponents) {
            products.add(own.times(exponent));
        }
        return new Dimension(List.copyOf(products));
    }

    /** The dimension of a whole power. */
    public Dimension power(int exponent) {
        return power(Rational.of(exponent));
    }

    /** Whether it is the dimension of a pure number. */
    public boolean isNone() {
        return equals(NONE);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Dimension that && exponents.equals(that.exponents);
    }

    @Override
    public int hashCode() {
        return exponents.hashCode();
    }

    /** The symbol of the coherent SI unit, such as {@code V/s}. */
    @Override
    public String toString() {
        return CoherentUnits.symbol(this);
    }
}
