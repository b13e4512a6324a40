package sill.inference;

import java.util.Optional;
import sill.units.Dimension;
import sill.units.Rational;

/**
 * What a number measures, or each number of a container.
 *
 * @param kind how much is known
 * @param dimension the dimension; {@link Dimension#NONE} where the kind is not {@link Kind#KNOWN}
 */
record Quantity(Kind kind, Dimension dimension) implements Value {
    /** A bare 0, a limit of {@code double}, an element of an empty container: fits every dimension. */
    static final Quantity ANY = new Quantity(Kind.ANY, Dimension.NONE);

    /** Made of bare numbers right here. */
    static final Quantity LITERAL = new Quantity(Kind.LITERAL, Dimension.NONE);

    /** Made of bare numbers and counts, by way of variables. */
    static final Quantity NUMBER = new Quantity(Kind.NUMBER, Dimension.NONE);

    /** Can't be known. */
    static final Quantity UNKNOWN = new Quantity(Kind.UNKNOWN, Dimension.NONE);

    /** How much is known, in the order in which a later kind outweighs an earlier one. */
    enum Kind {
        ANY,
        LITERAL,
        NUMBER,
        KNOWN,
        UNKNOWN
    }

    static Quantity of(Dimension dimension) {
        return new Quantity(Kind.KNOWN, dimension);
    }

    /** Whether there is a dimension to compare; a pure number's counts. */
    boolean hasDimension() {
        return kind != Kind.ANY && kind != Kind.UNKNOWN;
    }

    /** The dimension, where it is known. */
    Optional<Dimension> known() {
        return hasDimension() ? Optional.of(dimension) : Optional.empty();
    }

    /** Whether it is surely a pure number. */
    boolean isPure() {
        return hasDimension() && dimension.isNone();
    }

    /** Whether bare numbers alone made it, so that whoever wrote them may say what they measure. */
    boolean isMadeOfNumbers() {
        return kind == Kind.LITERAL || kind == Kind.NUMBER;
    }

    /** Whether nothing speaks against one measuring what the other does. */
    boolean fits(Quantity other) {
        return !hasDimension() || !other.hasDimension() || dimension.equals(other.dimension);
    }

    /** One or the other. */
    Quantity join(Quantity other) {
        if (kind == Kind.ANY || other.kind == Kind.UNKNOWN) {
            return other;
        } else if (other.kind == Kind.ANY || kind == Kind.UNKNOWN) {
            return this;
        } else if (!dimension.equals(other.dimension)) {
            return UNKNOWN;
        }
        return kind.compareTo(other.kind) >= 0 ? this : other;
    }

    /** What a variable holds that was given this. */
    Quantity named() {
        return kind == Kind.LITERAL ? NUMBER : this;
    }

    Quantity times(Quantity other) {
        return product(other, Rational.ONE);
    }

    Quantity over(Quantity other) {
        return product(other, Rational.of(-1));
    }

    private Quantity product(Quantity other, Rational exponent) {
        if (kind == Kind.ANY || other.kind == Kind.ANY) {
            // Strict, so that a loop's first round, with a sum still 0, settles nothing that its second would not.
            return ANY;
        } else if (kind == Kind.UNKNOWN || other.kind == Kind.UNKNOWN) {
            return UNKNOWN;
        } else if (isMadeOfNumbers() && other.isMadeOfNumbers()) {
            return join(other);
        }
        try {
            return of(dimension.times(other.dimension.power(exponent)));
        } catch (ArithmeticException e) {
            return UNKNOWN;
        }
    }

    Quantity power(Rational exponent) {
        if (kind != Kind.KNOWN) {
            return this;
        }
        try {
            return of(dimension.power(exponent));
        } catch (ArithmeticException e) {
            return UNKNOWN;
        }
    }

    /** The coherent SI unit's symbol, or words where there is none. */
    String said() {
        if (!hasDimension()) {
            return "an unknown unit";
        }
        return dimension.isNone() ? "a pure number" : dimension.toString();
    }
}
