package sill.stdlib;

import java.util.Set;
import java.util.regex.Pattern;

/**
 * Tells coherent SI units from others on an axis. All values are in coherent SI, so an axis in {@code mV} would show them
 * a thousand times too small; its drawing chooses the prefix.
 */
final class CoherentUnit {
    private static final Set<String> SYMBOLS = Set.of(
            "m", "kg", "s", "A", "K", "mol", "cd", "rad", "sr", "Hz", "N", "Pa", "J", "W", "C", "V", "F", "Ω", "S",
            "Wb", "T", "H", "lm", "lx");
    private static final Pattern BETWEEN_SYMBOLS = Pattern.compile("[·*/√()^⁻⁰¹²³⁴-⁹0-9\\-]+");

    private CoherentUnit() {}

    /** The symbol as the drawing wants it. */
    static String checked(String name, String unit) {
        String symbol = unit.replace("ohm", "Ω").replace("\u2126", "Ω").replace("sqrt", "√");
        boolean coherent = symbol.equals("1")
                || symbol.chars().anyMatch(Character::isLetter)
                        && BETWEEN_SYMBOLS
                                .splitAsStream(symbol)
                                .filter(part -> !part.isEmpty())
                                .allMatch(SYMBOLS::contains);
        if (!coherent) {
            throw new IllegalArgumentException(
                    name + " must be a coherent SI unit such as \"V\", \"Ω\" or \"K\", or \"1\""
                            + " for a pure number (the drawing chooses the prefix), got \"" + unit + "\"");
        }
        return symbol;
    }
}
