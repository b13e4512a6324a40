package sill.plot;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The unit in which an axis writes its numbers: the coherent SI unit with one prefix, or with a power of ten where a prefix
 * would be wrong, as for {@code m²}.
 *
 * @param symbol as the axis shows it, empty for a pure number
 * @param exponent power of ten by which the axis's numbers are smaller than the coherent SI values
 */
record AxisUnit(String symbol, int exponent) {
    // SI brochure, 9th edition (2019) with the prefixes of 2022, table 7.
    private static final String[] PREFIXES = {
        "q", "r", "y", "z", "a", "f", "p", "n", "µ", "m", "", "k", "M", "G", "T", "P", "E", "Z", "Y", "R", "Q"
    };
    private static final int SMALLEST = -30;
    private static final int LARGEST = 30;

    /** A unit whose first symbol has no exponent, so that a prefix on it scales the whole. */
    private static final Pattern TAKES_PREFIX = Pattern.compile("[A-Za-zΩ]+(?=$|[/·]).*");

    private static final Pattern KILOGRAM = Pattern.compile("kg(?=$|[/·])(.*)");

    /** The unit in which the largest size shown has one to three digits before the decimal sign. */
    static AxisUnit forLargest(String unit, double largest) {
        boolean pure = unit.isEmpty() || unit.equals("1");
        int thousands = largest > 0 ? 3 * Math.floorDiv(decimalExponent(largest), 3) : 0;
        Matcher kilogram = KILOGRAM.matcher(unit);
        if (kilogram.matches() && inPrefixes(thousands + 3, 3)) {
            return new AxisUnit(prefix(thousands + 3) + "g" + kilogram.group(1), thousands);
        }
        boolean takesPrefix =
                !pure && !kilogram.matches() && TAKES_PREFIX.matcher(unit).matches();
        if (takesPrefix && inPrefixes(thousands, largestPrefix(unit))) {
            return new AxisUnit(prefix(thousands) + unit, thousands);
        }
        boolean plain = largest >= 0.1 && largest < 1e5;
        return plain || thousands == 0
                ? unprefixed(unit)
                : new AxisUnit(power(thousands) + (pure ? "" : " " + unit), thousands);
    }

    /** Nobody reads kiloseconds or megametres; the same limits as in the record's values. */
    private static int largestPrefix(String unit) {
        String first = unit.split("[/·]", 2)[0];
        return first.equals("s") || first.equals("K") ? 0 : first.equals("m") ? 3 : LARGEST;
    }

    /** The coherent unit as it is. */
    static AxisUnit unprefixed(String unit) {
        return new AxisUnit(unit.equals("1") ? "" : unit, 0);
    }

    /** An axis label as a quantity divided by its unit (ISO 80000-1), so that the numbers beside it are pure. */
    String quotient(String label) {
        if (symbol.isEmpty()) {
            return label;
        }
        boolean compound = symbol.contains("/") || symbol.contains("·") || symbol.contains(" ");
        String divisor = compound ? "(" + symbol + ")" : symbol;
        return label.isEmpty() ? "/ " + divisor : label + " / " + divisor;
    }

    /** A coherent SI value as a number on this axis. */
    String number(BigDecimal si, int decimals) {
        BigDecimal scaled = si.scaleByPowerOfTen(-exponent).setScale(Math.max(decimals, 0), RoundingMode.HALF_EVEN);
        String digits = scaled.abs().toPlainString();
        return scaled.signum() < 0 ? "−" + digits : digits;
    }

    /** A value with its unit, to four significant digits. */
    String quantity(double si) {
        BigDecimal exact = new BigDecimal(si);
        int decimals = si == 0 ? 0 : 3 + exponent - decimalExponent(Math.abs(si));
        String number = number(exact, Math.min(decimals, 9));
        if (number.indexOf('.') >= 0) {
            number = number.replaceAll("0+$", "").replaceAll("\\.$", "");
        }
        return symbol.isEmpty() ? number : number + "\u00A0" + symbol;
    }

    /** Ten to a power in print. */
    static String power(int exponent) {
        String digits = Integer.toString(Math.abs(exponent));
        StringBuilder text = new StringBuilder("10").append(exponent < 0 ? "⁻" : "");
        digits.chars().forEach(digit -> text.append("⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(digit - '0')));
        return text.toString();
    }

    /** The power of ten of a positive number's first digit. */
    static int decimalExponent(double positive) {
        BigDecimal exact = new BigDecimal(positive);
        return exact.precision() - exact.scale() - 1;
    }

    private static boolean inPrefixes(int exponent, int largest) {
        return exponent >= SMALLEST && exponent <= largest;
    }

    private static String prefix(int exponent) {
        return PREFIXES[(exponent - SMALLEST) / 3];
    }
}
