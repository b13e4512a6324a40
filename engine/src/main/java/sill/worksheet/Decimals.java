package sill.worksheet;

import java.math.BigDecimal;

/**
 * Arithmetic on the decimal numbers that doubles print as. Limits are typed in decimals: 10 mV ± 3 mV reaches 13 mV and not
 * 13.000000000000001 mV, or a check at most 13 mV would fail by the last binary digit.
 */
final class Decimals {
    private Decimals() {}

    static double sum(double a, double b) {
        return Double.isFinite(a) && Double.isFinite(b)
                ? BigDecimal.valueOf(a).add(BigDecimal.valueOf(b)).doubleValue()
                : a + b;
    }

    static double product(double a, double b) {
        return Double.isFinite(a) && Double.isFinite(b)
                ? BigDecimal.valueOf(a).multiply(BigDecimal.valueOf(b)).doubleValue()
                : a * b;
    }
}
