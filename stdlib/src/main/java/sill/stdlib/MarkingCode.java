package sill.stdlib;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Marking codes for resistors and capacitors by IEC 60062:2016. In the letter code a letter gives the power of ten and
 * stands where the decimal sign would:
 *
 * <ul>
 *   <li>resistance in Ω: {@code L} 10⁻³, {@code R} 1, {@code K} 10³, {@code M} 10⁶, {@code G} 10⁹, {@code T} 10¹²;
 *   <li>capacitance in F: {@code p} 10⁻¹², {@code n} 10⁻⁹, {@code µ} 10⁻⁶, {@code m} 10⁻³, {@code F} 1.
 * </ul>
 *
 * <p>{@code k} is read as {@code K}, {@code u} as {@code µ}. Letters for 10¹² and from 10⁻³ F on are from memory of the
 * standard.
 */
public final class MarkingCode {
    private static final String RESISTANCE = "LRKMGT";
    private static final String CAPACITANCE = "pnµmF";
    private static final Pattern LETTER_CODE = Pattern.compile("(\\d{0,9})(\\p{L})(\\d{0,9})");
    private static final Pattern DIGIT_CODE = Pattern.compile("(\\d{2,3})([0-7])");
    private static final Pattern E96_CODE = Pattern.compile("(\\d\\d)([A-FXYZ])");
    private static final String E96_LETTERS = "ZYXABCDEF";
    private static final int MOST_DIGITS = 4;
    private static final double SAME = 1e-9;

    private MarkingCode() {}

    /**
     * Reads a letter code; the letter tells a resistance from a capacitance.
     *
     * @param code such as {@code 4K7}, {@code R47}, {@code 47K3}, {@code 4n7}, {@code 10p}
     * @return the value in Ω or F
     * @throws IllegalArgumentException when the code has no such form
     */
    @Unit("?")
    public static double parse(String code) {
        return read(
                code,
                RESISTANCE + CAPACITANCE,
                "code must be digits with one letter of L R K M G T (Ω) or p n µ m F (F) as the decimal sign,"
                        + " such as \"4K7\" or \"4n7\"");
    }

    /**
     * Reads a resistor's code: a letter code; two or three digits and the power of ten ({@code 472}, {@code 1002}); or the
     * place of a number in E96 and a letter ({@code 68C}), with the letters on which published tables agree: A to F for
     * 1 to 10⁵, and X, Y, Z for 10⁻¹ to 10⁻³.
     *
     * @param code as printed on the part
     * @return resistance in Ω
     * @throws IllegalArgumentException when the code has no such form
     */
    @Unit("Ω")
    public static double parseResistance(String code) {
        Matcher digits = DIGIT_CODE.matcher(code);
        if (digits.matches()) {
            return power(digits.group(1), Integer.parseInt(digits.group(2)));
        }
        Matcher place = E96_CODE.matcher(code);
        if (place.matches() && between(Integer.parseInt(place.group(1)), 1, 96)) {
            int decade = E96_LETTERS.indexOf(place.group(2)) - 1;
            return Series.E96.number(96 * decade + Integer.parseInt(place.group(1)) - 1);
        }
        return read(
                code,
                RESISTANCE,
                "resistor code must be digits with one letter of L R K M G T as the decimal sign, such as \"4K7\","
                        + " or digits and a power of ten from 0 to 7, such as \"472\","
                        + " or 01 to 96 and one letter of Z Y X A B C D E F, such as \"68C\"");
    }

    /**
     * Reads a capacitor's code: a letter code, or two digits and the power of ten in pF ({@code 472} is 4.7 nF; that the
     * unit is pF is common practice).
     *
     * @param code as printed on the part
     * @return capacitance in F
     * @throws IllegalArgumentException when the code has no such form
     */
    @Unit("F")
    public static double parseCapacitance(String code) {
        Matcher digits = DIGIT_CODE.matcher(code);
        if (digits.matches() && code.length() == 3) {
            return power(digits.group(1), Integer.parseInt(digits.group(2)) - 12);
        }
        return read(
                code,
                CAPACITANCE,
                "capacitor code must be digits with one letter of p n µ m F as the decimal sign, such as \"4n7\","
                        + " or two digits and a power of ten from 0 to 7 in pF, such as \"472\"");
    }

    /**
     * The letter code of a resistance, such as {@code 4K7} for 4700 Ω. Below 1 Ω it is {@code R47}, below 0.1 Ω
     * {@code 47L}.
     *
     * @param resistance from 1e-6 Ω to 1e15 Ω, of at most four significant digits (to within 1e-9)
     * @return the code, at least two digits and a letter
     * @throws IllegalArgumentException when the resistance breaks its rule
     */
    public static String format(@Unit("Ω") double resistance) {
        Arguments.within("resistance", Arguments.positive("resistance", resistance, "Ω"), "", 1e-6, 1e15, "Ω");
        BigDecimal value = decimal("resistance", resistance, "Ω");
        boolean tenths = value.compareTo(new BigDecimal("0.1")) >= 0 && value.compareTo(BigDecimal.ONE) < 0;
        return write(value, RESISTANCE, tenths ? 0 : group(value, -3, 12));
    }

    /**
     * The letter code of a capacitance, such as {@code 4n7} for 4.7 nF. Below 1 pF it is {@code p47}.
     *
     * @param capacitance from 1e-15 F to 1000 F, of at most four significant digits (to within 1e-9)
     * @return the code, at least two digits and a letter
     * @throws IllegalArgumentException when the capacitance breaks its rule
     */
    public static String formatCapacitance(@Unit("F") double capacitance) {
        Arguments.within("capacitance", Arguments.positive("capacitance", capacitance, "F"), "", 1e-15, 1000, "F");
        BigDecimal value = decimal("capacitance", capacitance, "F");
        return write(value, CAPACITANCE, group(value, -12, 0));
    }

    /**
     * The tolerance that a letter after the code means, for resistors, and for capacitors from 10 pF up: {@code B} 0.1 %,
     * {@code C} 0.25 %, {@code D} 0.5 %, {@code F} 1 %, {@code G} 2 %, {@code H} 3 %, {@code J} 5 %, {@code K} 10 %,
     * {@code M} 20 %, {@code N} 30 %; {@code E} 0.005 %, {@code L} 0.01 %, {@code P} 0.02 %, {@code W} 0.05 %. The last
     * four, and B and C, are from memory of the standard. Letters of unlike limits (Q, S, T, Z) are refused.
     *
     * @param letter one of these letters
     * @return the tolerance to either side, as a share of the value: 0.05 for ±5 %
     * @throws IllegalArgumentException for any other text
     */
    @Unit("1")
    public static double tolerance(String letter) {
        return switch (letter) {
            case "E" -> 0.00005;
            case "L" -> 0.0001;
            case "P" -> 0.0002;
            case "W" -> 0.0005;
            case "B" -> 0.001;
            case "C" -> 0.0025;
            case "D" -> 0.005;
            case "F" -> 0.01;
            case "G" -> 0.02;
            case "H" -> 0.03;
            case "J" -> 0.05;
            case "K" -> 0.1;
            case "M" -> 0.2;
            case "N" -> 0.3;
            default ->
                throw new IllegalArgumentException(
                        "tolerance letter must be one of E L P W B C D F G H J K M N, got \"" + letter + "\"");
        };
    }

    private static double read(String code, String letters, String rule) {
        Matcher matcher = LETTER_CODE.matcher(code);
        if (matcher.matches() && matcher.group(1).length() + matcher.group(3).length() > 0) {
            String letter = standard(matcher.group(2));
            if (letters.contains(letter)) {
                String digits = matcher.group(1) + matcher.group(3);
                return power(digits, exponent(letter) - matcher.group(3).length());
            }
        }
        throw new IllegalArgumentException(rule + ", got \"" + code + "\"");
    }

    /** The letter as the standard writes it. */
    private static String standard(String letter) {
        return switch (letter) {
            case "k" -> "K";
            case "u", "\u03bc" -> "µ"; // the Greek letter mu and the micro sign look alike
            default -> letter;
        };
    }

    private static int exponent(String letter) {
        int place = RESISTANCE.indexOf(letter);
        return place >= 0 ? 3 * place - 3 : 3 * CAPACITANCE.indexOf(letter) - 12;
    }

    private static double power(String digits, int exponent) {
        return new BigDecimal(digits).scaleByPowerOfTen(exponent).doubleValue();
    }

    private static boolean between(int number, int low, int high) {
        return low <= number && number <= high;
    }

    /** The decimal of at most four digits that {@code value} stands for. */
    private static BigDecimal decimal(String name, double value, String unit) {
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(MOST_DIGITS));
        if (Math.abs(rounded.doubleValue() - value) <= SAME * value) {
            return rounded;
        }
        throw Arguments.broken(name, "of at most " + MOST_DIGITS + " significant digits", value, unit);
    }

    /** The largest power of a thousand not above {@code value}, as a power of ten within the letters' span. */
    private static int group(BigDecimal value, int least, int most) {
        int power = value.precision() - value.scale() - 1;
        return Math.max(least, Math.min(most, 3 * Math.floorDiv(power, 3)));
    }

    private static String write(BigDecimal value, String letters, int exponent) {
        char letter = letters.charAt(letters.equals(RESISTANCE) ? exponent / 3 + 1 : exponent / 3 + 4);
        String number = value.scaleByPowerOfTen(-exponent).stripTrailingZeros().toPlainString();
        int point = number.indexOf('.');
        String whole = point < 0 ? number : number.substring(0, point);
        String fraction = point < 0 ? "" : number.substring(point + 1);
        if (whole.equals("0")) {
            whole = "";
        }
        String padding = whole.length() + fraction.length() < 2 ? "0" : "";
        return whole + letter + fraction + padding;
    }
}
