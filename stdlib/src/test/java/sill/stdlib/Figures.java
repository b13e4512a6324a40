package sill.stdlib;

import java.math.BigDecimal;

/** Compares numbers so that a failure tells all of it. */
final class Figures {
    private Figures() {}

    /** {@code actual} must lie within half a unit of the last digit that {@code printed} shows. */
    static void assertPrinted(String what, String printed, double actual) {
        BigDecimal expected = new BigDecimal(printed);
        // The binary form of the printed number adds its own rounding.
        double tolerance = expected.ulp().doubleValue() / 2 + Math.ulp(expected.doubleValue());
        assertWithin(what, expected.doubleValue(), actual, tolerance);
    }

    static void assertRelative(String what, double expected, double actual, double relative) {
        assertWithin(what, expected, actual, Math.abs(expected) * relative);
    }

    static void assertWithin(String what, double expected, double actual, double tolerance) {
        if (!(Math.abs(actual - expected) <= tolerance)) {
            throw new AssertionError(what + "\n  expected       " + expected + "\n  actual         " + actual
                    + "\n  relative error " + (actual - expected) / expected + "\n  tolerance      ± " + tolerance);
        }
    }
}
