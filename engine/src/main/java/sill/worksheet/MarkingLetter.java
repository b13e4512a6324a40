package sill.worksheet;

import java.util.Optional;

/**
 * The letters that stand for the decimal point in a marking code of IEC 60062:2016 ({@code 4K7}, {@code R47}, {@code 4n7}).
 */
enum MarkingLetter {
    MILLIOHM("L", -3, true, true),
    OHM("R", 0, true, false),
    KILOHM("Kk", 3, true, true),
    MEGOHM("M", 6, true, false),
    GIGOHM("G", 9, true, false),
    TEROHM("T", 12, true, true),
    PICOFARAD("p", -12, false, false),
    NANOFARAD("n", -9, false, false),
    MICROFARAD("µμu", -6, false, false),
    MILLIFARAD("m", -3, false, true),
    FARAD("F", 0, false, true);

    private final String letters;
    private final int exponent;
    private final boolean resistance;
    private final boolean unitToo;

    MarkingLetter(String letters, int exponent, boolean resistance, boolean unitToo) {
        this.letters = letters;
        this.exponent = exponent;
        this.resistance = resistance;
        this.unitToo = unitToo;
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
    boolean isUnitToo() {
        return unitToo;
    }
}
