package sill.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;

/**
 * Numbers with units as a record prints them, by the rules of the SI brochure (9th edition, 5.4) and ISO 80000-1: a space
 * between number and unit, none before the plane angles' {@code °}, {@code ′} and {@code ″}; a point as decimal marker with a
 * digit before it; a cross before a power of ten; a true minus sign. The spaces are no-break spaces, so that a line never ends between
 * a number and its unit. Nothing depends on the locale.
 *
 * <p>A computed value has four significant digits, zeros included, rounded half up from the shortest decimal form of the
 * {@code double}. 0 is written {@code 0}, a value that is not a number {@code not a number}.
 */
public final class Notation {
    /** U+00A0, which keeps a number and its unit together. */
    public static final char SPACE = '\u00a0';

    /** U+2212. */
    public static final char MINUS = '−';

    private static final int DIGITS = 4;

    private Notation() {}

    /**
     * A computed value with the prefix that puts its number between 1 and 1000.
     *
     * <p>The prefix stands before the unit's first factor, if that is not raised to a power and takes prefixes ({@code 5.000 kV},
     * {@code 12.00 nV/√Hz}). Seconds and kelvins get none for larger values, metres and grams none above kilo. Where no prefix
     * fits, the number is written plainly from 0.001 to below 10 000 and with a power of ten otherwise.
     *
     * @param si the value in coherent SI
     * @param unit its unit, with any prefix; {@code %}, {@code °C} and other units that take none stay as they are
     */
    public static String shown(double si, Unit unit) {
        return shown(si, unit, DIGITS);
    }

    /** As {@link #shown(double, Unit)}, with another number of digits. */
    private static String shown(double si, Unit unit, int digits) {
        Optional<UnitExpression> expression = prefixable(unit);
        if (expression.isEmpty()) {
            return shownIn(si, unit, digits);
        }
        UnitExpression bare = expression.get().withPrefix(Prefix.NONE);
        if (!Double.isFinite(si) || si == 0) {
            return shownIn(si, bare.toUnit(), digits);
        }
        BigDecimal number = bare.toUnit().exactFromSi(si).round(rounding(digits));
        Prefix prefix = prefix(bare.top().get(0).unit(), magnitude(number));
        BigDecimal scaled = number.scaleByPowerOfTen(-prefix.exponent());
        return joined(rounded(scaled, digits), bare.withPrefix(prefix).symbol());
    }

    /**
     * What {@link #shown(double, Unit)} prints with a number of significant digits.
     *
     * @param digits at least 1
     */
    public static PrintedQuantity printed(double si, Unit unit, int digits) {
        return PrintedQuantity.of(shown(si, unit, digits), si);
    }

    /** What {@link #shownIn(double, Unit)} prints with a number of significant digits, at least 1. */
    public static PrintedQuantity printedIn(double si, Unit unit, int digits) {
        return PrintedQuantity.of(shownIn(si, unit, digits), si);
    }

    /** What {@link #plain(double, Unit)} prints. */
    public static PrintedQuantity printedPlain(double si, Unit unit) {
        return PrintedQuantity.of(plain(si, unit), si);
    }

    /**
     * A computed value in exactly this unit: four significant digits, with a power of ten from 10 000 and below 0.001.
     *
     * @param si the value in coherent SI
     */
    public static String shownIn(double si, Unit unit) {
        return shownIn(si, unit, DIGITS);
    }

    private static String shownIn(double si, Unit unit, int digits) {
        if (!Double.isFinite(si)) {
            return notFinite(si, unit);
        }
        BigDecimal number = unit.exactFromSi(si);
        return joined(number.signum() == 0 ? "0" : rounded(number.round(rounding(digits)), digits), unit.symbol());
    }

    /**
     * A stated value as it was typed: the shortest decimal number in exactly this unit that reads back to the same
     * {@code double}.
     *
     * @param si the value in coherent SI
     */
    public static String plain(double si, Unit unit) {
        return Double.isFinite(si) ? joined(digits(shortest(si, unit)), unit.symbol()) : notFinite(si, unit);
    }

    /**
     * All digits of a value in its coherent SI unit: the shortest decimal number that reads back to the same {@code double}.
     *
     * @param si the value in coherent SI
     */
    public static String full(double si, Unit unit) {
        return plain(si, unit.coherent());
    }

    private static Optional<UnitExpression> prefixable(Unit unit) {
        try {
            UnitExpression expression = UnitParser.parse(unit.symbol());
            boolean takesPrefix = !expression.top().isEmpty()
                    && expression.top().get(0).exponent().equals(Rational.ONE)
                    && expression.top().get(0).unit().prefixable();
            return takesPrefix ? Optional.of(expression) : Optional.empty();
        } catch (UnitException e) {
            // A unit somebody named otherwise is printed as it is.
            return Optional.empty();
        }
    }

    /** The prefix that leaves a number from 1 to below 1000; where none does, one that leaves a plain number, or none. */
    private static Prefix prefix(NamedUnit unit, int magnitude) {
        int wanted = Math.floorDiv(magnitude, 3) * 3;
        int exponent = Math.min(wanted, unit.highestPrefix());
        boolean plain = magnitude - exponent < DIGITS;
        Prefix otherwise = unit.equals(NamedUnit.GRAM) && magnitude > 0 ? Prefix.KILO : Prefix.NONE;
        return plain ? Prefix.ofExponent(exponent).orElse(otherwise) : otherwise;
    }

    private static BigDecimal shortest(double si, Unit unit) {
        BigDecimal exact = unit.exactFromSi(si);
        for (int digits = 1; digits < 20; digits++) {
            BigDecimal candidate = exact.round(new MathContext(digits));
            if (unit.toSi(candidate) == si) {
                return candidate;
            }
        }
        return exact;
    }

    private static String notFinite(double si, Unit unit) {
        if (Double.isNaN(si)) {
            return "not a number";
        }
        return joined((si < 0 ? String.valueOf(MINUS) : "") + "∞", unit.symbol());
    }

    private static String joined(String number, String symbol) {
        return switch (symbol) {
            case "1" -> number;
            case "°", "′", "″" -> number + symbol;
            default -> number + SPACE + (symbol.startsWith("1/") ? reciprocal(symbol) : symbol);
        };
    }

    /** {@code 1/K} after a number is K⁻¹, lest the 1 be read as a digit; under a root it stays. */
    private static String reciprocal(String symbol) {
        String denominator = symbol.substring(2);
        boolean oneSymbol = denominator.codePoints().allMatch(Character::isLetter);
        return oneSymbol ? denominator + Superscript.of(-1) : symbol;
    }

    private static MathContext rounding(int digits) {
        return new MathContext(digits, RoundingMode.HALF_UP);
    }

    /** A number of so many significant digits, with the zeros at its end. */
    private static String rounded(BigDecimal number, int digits) {
        int magnitude = magnitude(number);
        if (magnitude >= -3 && magnitude < digits) {
            return signed(number.setScale(digits - 1 - magnitude, RoundingMode.HALF_UP)
                    .toPlainString());
        }
        BigDecimal mantissa = number.scaleByPowerOfTen(-magnitude).setScale(digits - 1, RoundingMode.HALF_UP);
        return withPower(signed(mantissa.toPlainString()), magnitude);
    }

    /** A number with all its digits and no zeros at its end. */
    private static String digits(BigDecimal number) {
        if (number.signum() == 0) {
            return "0";
        }
        int magnitude = magnitude(number);
        if (magnitude >= -6 && magnitude < 15) {
            return signed(number.stripTrailingZeros().toPlainString());
        }
        BigDecimal mantissa = number.scaleByPowerOfTen(-magnitude).stripTrailingZeros();
        return withPower(signed(mantissa.toPlainString()), magnitude);
    }

    private static String withPower(String mantissa, int exponent) {
        return mantissa + SPACE + "×" + SPACE + "10" + Superscript.of(exponent);
    }

    private static String signed(String digits) {
        return digits.replace('-', MINUS);
    }

    /** The power of ten of the first digit. */
    private static int magnitude(BigDecimal number) {
        return number.precision() - number.scale() - 1;
    }
}
