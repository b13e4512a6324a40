package sill.record.html;

import com.fasterxml.jackson.core.io.NumberOutput;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers of the page that have no unit of their own: in lists and tables, as shares. */
final class Numbers {
    private static final MathContext FOUR_DIGITS = new MathContext(4, RoundingMode.HALF_EVEN);

    private Numbers() {}

    /** Four significant digits. */
    static String brief(double value) {
        if (!Double.isFinite(value)) {
            return full(value);
        }
        return plain(new BigDecimal(value).round(FOUR_DIGITS), 6);
    }

    private static String plain(BigDecimal number, int largestExponent) {
        if (number.signum() == 0) {
            return "0";
        }
        BigDecimal digits = number.stripTrailingZeros();
        int exponent = digits.precision() - digits.scale() - 1;
        if (exponent >= -4 && exponent <= largestExponent) {
            return minus(digits.toPlainString());
        }
        return minus(digits.scaleByPowerOfTen(-exponent).toPlainString()) + "\u00A0×\u00A010" + superscript(exponent);
    }

    /** As many digits as it takes to read the same {@code double} back, the same on every Java. */
    static String full(double value) {
        if (Double.isNaN(value)) {
            return "not a number";
        }
        if (Double.isInfinite(value)) {
            return value > 0 ? "∞" : "−∞";
        }
        // Java before 19 prints some doubles with a digit too many; Jackson's writer is its own.
        return plain(new BigDecimal(NumberOutput.toString(value, true)), 15);
    }

    /** A share as a percentage with a sign, to one decimal. */
    static String percent(double share) {
        if (!Double.isFinite(share)) {
            return full(share);
        }
        BigDecimal percent = new BigDecimal(share).scaleByPowerOfTen(2).setScale(1, RoundingMode.HALF_EVEN);
        return (percent.signum() > 0 ? "+" : "") + minus(percent.toPlainString()) + "\u00A0%";
    }

    private static String minus(String digits) {
        return digits.startsWith("-") ? "−" + digits.substring(1) : digits;
    }

    private static String superscript(int exponent) {
        StringBuilder text = new StringBuilder(exponent < 0 ? "⁻" : "");
        Integer.toString(Math.abs(exponent)).chars().forEach(digit -> text.append("⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(digit - '0')));
        return text.toString();
    }
}
