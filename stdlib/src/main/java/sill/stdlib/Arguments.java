package sill.stdlib;

/**
 * The rules that helpers hold their arguments to. A message names the argument, its rule and its value, as in
 * {@code rIn must be above 0 Ω, got -8200.0 Ω}. Conditions say what is allowed, so that NaN fails them.
 */
final class Arguments {
    private Arguments() {}

    static double finite(String name, double value, String unit) {
        if (Double.isFinite(value)) {
            return value;
        }
        throw broken(name, "finite", value, unit);
    }

    static double positive(String name, double value, String unit) {
        if (finite(name, value, unit) > 0) {
            return value;
        }
        throw broken(name, "above " + with("0", unit), value, unit);
    }

    static double notNegative(String name, double value, String unit) {
        if (finite(name, value, unit) >= 0) {
            return value;
        }
        throw broken(name, "at least " + with("0", unit), value, unit);
    }

    /** Both must be finite, and the first below the second. */
    static void below(String name, double value, String limitName, double limit, String unit) {
        finite(name, value, unit);
        finite(limitName, limit, unit);
        if (!(value < limit)) {
            throw broken(name, "below " + named(limitName, limit, unit), value, unit);
        }
    }

    /** Both must be finite, and the first not above the second. */
    static void atMost(String name, double value, String limitName, double limit, String unit) {
        finite(name, value, unit);
        finite(limitName, limit, unit);
        if (!(value <= limit)) {
            throw broken(name, "at most " + named(limitName, limit, unit), value, unit);
        }
    }

    static double within(String name, double value, String rule, double low, double high, String unit) {
        if (finite(name, value, unit) >= low && value <= high) {
            return value;
        }
        String span = with(Double.toString(low), unit) + " .. " + with(Double.toString(high), unit);
        throw broken(name, "within " + (rule.isEmpty() ? span : rule + " (" + span + ")"), value, unit);
    }

    /** What to throw when {@code name} does not follow {@code rule}. */
    static IllegalArgumentException broken(String name, String rule, double value, String unit) {
        return new IllegalArgumentException(name + " must be " + rule + ", got " + with(Double.toString(value), unit));
    }

    private static String named(String name, double value, String unit) {
        return name + " (" + with(Double.toString(value), unit) + ")";
    }

    private static String with(String number, String unit) {
        return unit.isEmpty() ? number : number + " " + unit;
    }
}
