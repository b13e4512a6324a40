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
        BigDecimal rounded = new BigDecimal(value).round(FOUR_DIGITS);
        if (rounded.signum() == 0) {
            return "0";
        }
        int exponent = rounded.precision() - rounded.scale() - 1;
        if (exponent >= -4 && exponent <= 6) {
            return minus(rounded.stripTrailingZeros().toPlainString());
        }
        String mantissa =
                rounded.scaleByPowerOfTen(-exponent).stripTrailingZeros().toPlainString();
        return minus(mantissa + " × 10") + superscript(exponent);
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
        return minus(NumberOutput.toString(value, true));
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
