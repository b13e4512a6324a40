package sill.units;

/** Whole numbers in raised digits. */
public final class Superscript {
    private static final String DIGITS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private Superscript() {}

    /** A whole number in raised digits. */
    public static String of(int number) {
        StringBuilder raised = new StringBuilder();
        for (char c : Integer.toString(number).toCharArray()) {
            raised.append(c == '-' ? '⁻' : DIGITS.charAt(c - '0'));
        }
        return raised.toString();
    }

    /** The digit that a raised one stands for; −1 for any other character. */
    static int digit(char c) {
        return DIGITS.indexOf(c);
    }

    static boolean isSign(char c) {
        return c == '⁻' || c == '⁺';
    }
}
