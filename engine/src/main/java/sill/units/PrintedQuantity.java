package sill.units;

import java.math.BigDecimal;

/**
 * A number with its unit as {@link Notation} prints it, taken apart again. What it stands for is read from the printed digits,
 * so that a reader who copies them computes with the same number.
 *
 * @param text the whole
 * @param mantissa digits with a true minus sign; {@code ∞} or words for what is not finite
 * @param power exponent of the power of ten behind them; 0 for none
 * @param unit unit symbol, without the space before it; empty for a pure number
 * @param si what the printed text stands for, in coherent SI
 */
public record PrintedQuantity(String text, String mantissa, int power, String unit, double si) {
    private static final String TIMES_TEN = Notation.SPACE + "×" + Notation.SPACE + "10";

    /**
     * Takes a printed text apart.
     *
     * @param printed what {@link Notation} gave
     * @param si the value that was printed; it counts when that is not finite
     */
    static PrintedQuantity of(String printed, double si) {
        if (!Double.isFinite(si)) {
            return new PrintedQuantity(printed, printed, 0, "", si);
        }
        int end = 0;
        while (end < printed.length() && isDigit(printed.charAt(end))) {
            end++;
        }
        String mantissa = printed.substring(0, end);
        int power = 0;
        if (printed.startsWith(TIMES_TEN, end)) {
            end += TIMES_TEN.length();
            int sign = 1;
            for (; end < printed.length(); end++) {
                char c = printed.charAt(end);
                if (Superscript.isSign(c)) {
                    sign = -1;
                } else if (Superscript.digit(c) >= 0) {
                    power = power * 10 + Superscript.digit(c);
                } else {
                    break;
                }
            }
            power *= sign;
        }
        String unit = printed.substring(printed.startsWith(String.valueOf(Notation.SPACE), end) ? end + 1 : end);
        BigDecimal number = new BigDecimal(mantissa.replace(Notation.MINUS, '-')).scaleByPowerOfTen(power);
        return new PrintedQuantity(printed, mantissa, power, unit, inSi(number, unit));
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9' || c == '.' || c == Notation.MINUS;
    }

    private static double inSi(BigDecimal number, String unit) {
        try {
            return unit.isEmpty() ? number.doubleValue() : Unit.parse(unit).toSi(number);
        } catch (UnitException e) {
            throw new IllegalArgumentException("a printed unit must be readable, got " + unit, e);
        }
    }

    /** Whether it starts with a minus sign. */
    public boolean isNegative() {
        return mantissa.charAt(0) == Notation.MINUS;
    }
}
