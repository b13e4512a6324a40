package sill.record;

import java.math.BigDecimal;
import java.math.RoundingMode;
import sill.units.Notation;

/** Shares of samples as text, with as many digits as tell a share near all from all. */
public final class Shares {
    private static final int DECIMALS = 4;

    private Shares() {}

    /** Such as {@code 99.73 %}; rounded down, lest a share seem to reach what it misses. */
    public static String percent(double share) {
        return text(share, RoundingMode.FLOOR);
    }

    /** The distance of two shares with its sign, such as {@code +0.12 %}. */
    static String points(double distance) {
        return (distance > 0 ? "+" : "") + text(distance, RoundingMode.FLOOR);
    }

    private static String text(double share, RoundingMode rounding) {
        BigDecimal percent = BigDecimal.valueOf(share)
                .scaleByPowerOfTen(2)
                .setScale(DECIMALS, rounding)
                .stripTrailingZeros();
        return percent.toPlainString().replace('-', Notation.MINUS) + Notation.SPACE + "%";
    }
}
