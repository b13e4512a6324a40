package sill.worksheet;

/** Reads an exponent in raised digits, as in {@code 10⁻³}. */
final class RaisedDigits {
    private static final String DIGITS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private RaisedDigits() {}

    static boolean startsAt(Cursor cursor) {
        int sign = isSign(cursor.peek()) ? 1 : 0;
        return DIGITS.indexOf(cursor.peek(sign)) >= 0;
    }

    static int read(Cursor cursor) {
        boolean negative = cursor.peek() == '⁻';
        if (isSign(cursor.peek())) {
            cursor.skip(1);
        }
        int number = 0;
        while (DIGITS.indexOf(cursor.peek()) >= 0) {
            number = Math.min(100_000_000, number * 10 + DIGITS.indexOf(cursor.peek()));
            cursor.skip(1);
        }
        return negative ? -number : number;
    }

    private static boolean isSign(char c) {
        return c == '⁻' || c == '⁺';
    }
}
