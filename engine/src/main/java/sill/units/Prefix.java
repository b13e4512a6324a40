package sill.units;

import java.util.Optional;

/** The SI prefixes (SI brochure, 9th edition, updated 2022, table 7; 27th CGPM, resolution 3). */
enum Prefix {
    QUETTA("Q", 30),
    RONNA("R", 27),
    YOTTA("Y", 24),
    ZETTA("Z", 21),
    EXA("E", 18),
    PETA("P", 15),
    TERA("T", 12),
    GIGA("G", 9),
    MEGA("M", 6),
    KILO("k", 3),
    HECTO("h", 2),
    DECA("da", 1),
    NONE("", 0),
    DECI("d", -1),
    CENTI("c", -2),
    MILLI("m", -3),
    MICRO("µ", -6),
    NANO("n", -9),
    PICO("p", -12),
    FEMTO("f", -15),
    ATTO("a", -18),
    ZEPTO("z", -21),
    YOCTO("y", -24),
    RONTO("r", -27),
    QUECTO("q", -30);

    private final String symbol;
    private final int exponent;

    Prefix(String symbol, int exponent) {
        this.symbol = symbol;
        this.exponent = exponent;
    }

    String symbol() {
        return symbol;
    }

    /** The power of ten it stands for. */
    int exponent() {
        return exponent;
    }

    /** The prefix for a power of ten, where there is one. */
    static Optional<Prefix> ofExponent(int exponent) {
        for (Prefix prefix : values()) {
            if (prefix.exponent == exponent) {
                return Optional.of(prefix);
            }
        }
        return Optional.empty();
    }

    /** The prefix with this symbol; the empty one is no prefix. */
    static Optional<Prefix> ofSymbol(String symbol) {
        // The micro sign U+00B5 is the one keyboards have; the letter mu U+03BC and the Latin u mean the same.
        String spelled = symbol.equals("u") || symbol.equals("μ") ? "µ" : symbol;
        for (Prefix prefix : values()) {
            if (!spelled.isEmpty() && prefix.symbol.equals(spelled)) {
                return Optional.of(prefix);
            }
        }
        return Optional.empty();
    }
}
