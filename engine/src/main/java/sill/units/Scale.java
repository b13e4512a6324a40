package sill.units;

import java.math.BigDecimal;

/**
 * The size of a unit as {@code rest × 10^tens}, apart so that powers of ten stay exact.
 *
 * @param tens power of ten; a fraction under a root
 * @param rest what is not a power of ten; above 0
 */
record Scale(Rational tens, double rest) {
    static Scale ten(int exponent) {
        return new Scale(Rational.of(exponent), 1);
    }

    static Scale of(double rest) {
        return new Scale(Rational.ZERO, rest);
    }

    Scale times(Scale other) {
        return new Scale(tens.plus(other.tens), rest * other.rest);
    }

    Scale power(Rational exponent) {
        double power = rest == 1 ? 1 : StrictMath.pow(rest, exponent.toDouble());
        return new Scale(tens.times(exponent), power);
    }

    /** The nearest {@code double}; 0 or infinite when it leaves the range. */
    double toDouble() {
        int whole = Math.floorDiv(tens.numerator(), tens.denominator());
        double part = rest;
        if (!tens.isWhole()) {
            Rational fraction = tens.plus(Rational.of(-whole));
            part *= StrictMath.pow(10, fraction.toDouble());
        }
        if (part == 0 || !Double.isFinite(part)) {
            return part;
        }
        return BigDecimal.valueOf(part).scaleByPowerOfTen(whole).doubleValue();
    }
}
