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
        return text(BigDecimal.valueOf(share));
    }

    /** How far a share lies above a wanted one, such as {@code +0.12 %}. */
    static String above(double share, double wanted) {
        BigDecimal distance = BigDecimal.valueOf(share).subtract(BigDecimal.valueOf(wanted));
        return (distance.signum() > 0 ? "+" : "") + text(distance);
    }

    private static String text(BigDecimal share) {
        BigDecimal percent = share.scaleByPowerOfTen(2)
                .setScale(DECIMALS, RoundingMode.FLOOR)
                .stripTrailingZeros();
        return percent.toPlainString().replace('-', Notation.MINUS) + Notation.SPACE + "%";
    }
}
