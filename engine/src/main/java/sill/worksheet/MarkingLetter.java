package sill.worksheet;

import java.util.Optional;

/**
 * The letters that stand for the decimal point in a marking code of IEC 60062:2016 ({@code 4K7}, {@code R47}, {@code 4n7}).
 */
enum MarkingLetter {
    MILLIOHM("L", -3, true),
    OHM("R", 0, true),
    KILOHM("Kk", 3, true),
    MEGOHM("M", 6, true),
    GIGOHM("G", 9, true),
    TEROHM("T", 12, true),
    PICOFARAD("p", -12, false),
    NANOFARAD("n", -9, false),
    MICROFARAD("µμu", -6, false),
    MILLIFARAD("m", -3, false),
    FARAD("F", 0, false);

    private final String letters;
    private final int exponent;
    private final boolean resistance;

    MarkingLetter(String letters, int exponent, boolean resistance) {
        this.letters = letters;
        this.exponent = exponent;
        this.resistance = resistance;
    }

    static Optional<MarkingLetter> of(char c) {
        for (MarkingLetter letter : values()) {
            if (letter.letters.indexOf(c) >= 0) {
                return Optional.of(letter);
            }
        }
        return Optional.empty();
    }

    /** The power of ten it multiplies by. */
    int exponent() {
        return exponent;
    }

    /** The unit of the quantity it marks. */
    String unit() {
        return resistance ? "Ω" : "F";
    }

    /** The SI prefix that says the same. */
    String prefix() {
        return switch (this) {
            case MILLIOHM, MILLIFARAD -> "m";
            case OHM, FARAD -> "";
            case KILOHM -> "k";
            case MEGOHM -> "M";
            case GIGOHM -> "G";
            case TEROHM -> "T";
            case PICOFARAD -> "p";
            case NANOFARAD -> "n";
            case MICROFARAD -> "µ";
        };
    }

    /** Whether the letter behind a number could as well be a unit (litre, kelvin, tesla, metre, farad). */
    static boolean isUnitToo(char letter) {
        return "LKTmF".indexOf(letter) >= 0;
    }
}
