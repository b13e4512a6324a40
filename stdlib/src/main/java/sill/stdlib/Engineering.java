package sill.stdlib;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;

/** Numbers as a plot's description says them: four significant digits and an SI prefix. */
final class Engineering {
    private static final List<String> PREFIXES = List.of("p", "n", "µ", "m", "", "k", "M", "G");
    private static final int LEAST = -12;
    private static final int MOST = 9;

    private Engineering() {}

    static String text(double value, String unit) {
        BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(4));
        int power = rounded.precision() - rounded.scale() - 1;
        boolean prefixed = takesPrefix(unit) && rounded.signum() != 0;
        int group = prefixed ? Math.max(LEAST, Math.min(MOST, 3 * Math.floorDiv(power, 3))) : 0;
        BigDecimal number = rounded.scaleByPowerOfTen(-group).stripTrailingZeros();
        boolean plain = rounded.signum() == 0 || Math.abs(power - group) <= 6;
        String digits = (plain ? number.toPlainString() : number.toString()).replace('-', '−');
        return unit.equals("1") ? digits : digits + " " + PREFIXES.get((group - LEAST) / 3) + unit;
    }

    /** A prefix before a number, a quotient of one, or a unit that has one would be wrong. */
    private static boolean takesPrefix(String unit) {
        return !unit.startsWith("1") && !unit.startsWith("kg");
    }
}
