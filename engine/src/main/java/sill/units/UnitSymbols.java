package sill.units;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.units.UnitExpression.Factor;
import sill.words.NearestWord;
import sill.words.Quoted;

/** One unit symbol with or without a prefix, and what to say about one that is unknown. */
final class UnitSymbols {
    /** What is often typed for a unit but is none, with what to write; nearness would not find these. */
    private static final Map<String, String> INSTEAD = Map.ofEntries(
            Map.entry("R", "Ω"),
            Map.entry("mAh", "mA·h"),
            Map.entry("Ah", "A·h"),
            Map.entry("Wh", "W·h"),
            Map.entry("kWh", "kW·h"),
            Map.entry("Vs", "V·s"),
            Map.entry("As", "A·s"),
            Map.entry("VA", "V·A"),
            Map.entry("Nm", "N·m"),
            Map.entry("sec", "s"),
            Map.entry("hr", "h"),
            Map.entry("rpm", "1/min"),
            Map.entry("volt", "V"),
            Map.entry("volts", "V"),
            Map.entry("amp", "A"),
            Map.entry("amps", "A"),
            Map.entry("hertz", "Hz"),
            Map.entry("farad", "F"),
            Map.entry("°K", "K"));

    private static final List<String> COMMON_PREFIXES = List.of("", "k", "m", "µ", "M", "n", "p", "G");

    private UnitSymbols() {}

    /** The longest whole unit first, then a prefix with a unit. */
    static UnitExpression resolve(String symbol, int position) throws UnitException {
        NamedUnit whole = NamedUnit.find(symbol);
        if (whole != null) {
            return single(Prefix.NONE, whole);
        }
        // "da" is the one prefix of two letters and none other is "d" before a unit that begins with "a".
        for (int length = Math.min(2, symbol.length() - 1); length >= 1; length--) {
            Optional<Prefix> prefix = Prefix.ofSymbol(symbol.substring(0, length));
            NamedUnit unit = NamedUnit.find(symbol.substring(length));
            if (prefix.isPresent() && unit != null && unit.prefixable()) {
                return single(prefix.get(), unit);
            }
        }
        throw unknown(symbol, position);
    }

    static UnitExpression single(Prefix prefix, NamedUnit unit) {
        return new UnitExpression(List.of(new Factor(prefix, unit, Rational.ONE)), List.of());
    }

    private static UnitException unknown(String symbol, int position) {
        if (symbol.startsWith("dB")) {
            return new UnitException(
                    position,
                    Quoted.of(symbol),
                    "a linear unit",
                    "Write the level as a plain value or ratio; 20 dB between voltages is 10.");
        }
        return new UnitException(position, Quoted.of(symbol), "a unit such as V, kΩ, µF or ppm/K", mend(symbol));
    }

    private static String mend(String symbol) {
        if (symbol.equals("°F") || symbol.equals("degF")) {
            return "Convert the value to °C or K.";
        }
        String instead = INSTEAD.get(symbol);
        if (instead != null) {
            return "Write " + Quoted.of(instead) + ".";
        }
        if (Prefix.ofSymbol(symbol).isPresent()) {
            return "A prefix needs its unit, such as " + Quoted.of(symbol + "V") + ".";
        }
        int letters = symbol.length();
        while (letters > 0 && Character.isDigit(symbol.charAt(letters - 1))) {
            letters--;
        }
        if (letters > 0 && letters < symbol.length()) {
            return "Write a power as " + Quoted.of(symbol.substring(0, letters) + "^" + symbol.substring(letters))
                    + ".";
        }
        String sought = symbol.startsWith("u") && symbol.length() > 1 ? "µ" + symbol.substring(1) : symbol;
        return NearestWord.hint(sought, likely(), "");
    }

    private static List<String> likely() {
        List<String> symbols = new ArrayList<>();
        for (String prefix : COMMON_PREFIXES) {
            for (NamedUnit unit : NamedUnit.ALL) {
                if (prefix.isEmpty() || unit.prefixable()) {
                    symbols.add(prefix + unit.symbol());
                    unit.spellings().forEach(spelling -> symbols.add(prefix + spelling));
                }
            }
        }
        return symbols;
    }
}
