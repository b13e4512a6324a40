package sill.tests.formulas;

import java.math.BigDecimal;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sill.units.Unit;
import sill.units.UnitException;

/**
 * A printed number with its unit.
 *
 * @param si its value
 * @param half half a unit of its last printed digit
 */
record Quantity(double si, double half) {
    private static final Pattern PRINTED =
            Pattern.compile("(−?[0-9]+(?:\\.[0-9]+)?)(?:\u00A0×\u00A010([⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+))?\u00A0?(.*)");

    /** Reads a printed text such as {@code −1.500 × 10⁻³ V}. */
    static Quantity of(String text) {
        Matcher matcher = PRINTED.matcher(text.strip());
        if (!matcher.matches()) {
            throw new IllegalArgumentException("a printed number must start with digits, got " + text);
        }
        BigDecimal number = new BigDecimal(matcher.group(1).replace('−', '-'));
        int power = matcher.group(2) == null ? 0 : raised(matcher.group(2));
        BigDecimal half = BigDecimal.ONE
                .movePointLeft(Math.max(0, number.scale()))
                .scaleByPowerOfTen(power)
                .divide(BigDecimal.valueOf(2));
        BigDecimal scaled = number.scaleByPowerOfTen(power);
        Unit unit = unit(matcher.group(3));
        return new Quantity(unit.toSi(scaled), half.doubleValue() * unit.factor());
    }

    /** Whether a value is what is printed, to the last printed digit. */
    boolean shows(double value) {
        return Math.abs(value - si) <= half * 1.000001 + 1e-12 * Math.abs(si);
    }

    static Unit unit(String symbol) {
        try {
            return symbol.isEmpty() ? Unit.ONE : Unit.parse(symbol);
        } catch (UnitException e) {
            throw new IllegalArgumentException("a printed unit must be readable, got " + symbol, e);
        }
    }

    /** A whole number in raised digits. */
    static int raised(String text) {
        StringBuilder plain = new StringBuilder();
        for (char c : text.toCharArray()) {
            plain.append(c == '⁻' ? '-' : (char) ('0' + "⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(c)));
        }
        return Integer.parseInt(plain.toString());
    }
}
