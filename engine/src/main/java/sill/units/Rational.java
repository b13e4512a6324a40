package sill.units;

/**
 * A fraction in lowest terms with a positive denominator: the exponent of a unit or a dimension.
 *
 * @param numerator any whole number
 * @param denominator above 0
 */
public record Rational(int numerator, int denominator) {
    /** Nothing. */
    public static final Rational ZERO = new Rational(0, 1);

    /** One. */
    public static final Rational ONE = new Rational(1, 1);

    /** The exponent of a square root. */
    public static final Rational HALF = new Rational(1, 2);

    /**
     * Reduces to lowest terms.
     *
     * @throws IllegalArgumentException if the denominator is 0
     * @throws ArithmeticException if a term leaves the range of {@code int}
     */
    public Rational {
        if (denominator == 0) {
            throw new IllegalArgumentException("denominator must not be 0, found " + numerator + "/0");
        }
        long divisor = commonDivisor(Math.abs((long) numerator), Math.abs((long) denominator));
        long sign = denominator < 0 ? -1 : 1;
        numerator = Math.toIntExact(sign * numerator / divisor);
        denominator = Math.toIntExact(sign * denominator / divisor);
    }

    /** A whole number. */
    public static Rational of(int whole) {
        return new Rational(whole, 1);
    }

    /** The sum. Throws {@link ArithmeticException} if a term leaves the range of {@code int}. */
    public Rational plus(Rational other) {
        long divisor = commonDivisor(denominator, other.denominator);
        long common = denominator / divisor * other.denominator;
        long sum = Math.addExact(numerator * (common / denominator), other.numerator * (common / other.denominator));
        return reduced(sum, common);
    }

    /** The product. Throws {@link ArithmeticException} if a term leaves the range of {@code int}. */
    public Rational times(Rational other) {
        return reduced((long) numerator * other.numerator, (long) denominator * other.denominator);
    }

    /** The number with its sign turned. */
    public Rational negated() {
        return new Rational(Math.negateExact(numerator), denominator);
    }

    /** Below 0: −1; 0: 0; above 0: 1. */
    public int sign() {
        return Integer.signum(numerator);
    }

    /** Whether it is a whole number. */
    public boolean isWhole() {
        return denominator == 1;
    }

    /** The nearest {@code double}. */
    public double toDouble() {
        return (double) numerator / denominator;
    }

    // Written out: a record's own are put together at run time, which each start would wait for.

    @Override
    public boolean equals(Object other) {
        return other instanceof Rational that && numerator == that.numerator && denominator == that.denominator;
    }

    @Override
    public int hashCode() {
        return 31 * numerator + denominator;
    }

    /** Such as {@code 2} or {@code -1/2}. */
    @Override
    public String toString() {
        return isWhole() ? Integer.toString(numerator) : numerator + "/" + denominator;
    }

    private static Rational reduced(long numerator, long denominator) {
        long divisor = commonDivisor(Math.abs(numerator), denominator);
        return new Rational(Math.toIntExact(numerator / divisor), Math.toIntExact(denominator / divisor));
    }

    private static long commonDivisor(long a, long b) {
        return b == 0 ? Math.max(a, 1) : commonDivisor(b, a % b);
    }
}
