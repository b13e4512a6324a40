package sill.worksheet;

import java.math.BigDecimal;
import java.util.Optional;
import sill.words.Quoted;

/**
 * Reads a number: a sign, digits with a decimal point, an exponent ({@code 1e-3}, {@code 1.2 × 10^-3}), or a marking code
 * ({@code 8k2}).
 */
final class NumberReader {
    /** More digits than a double can tell apart; beyond them the exact value would only cost time. */
    private static final int LONGEST_EXACT = 800;

    private static final String A_NUMBER = "a number such as 24, 4.7, 1e-3 or 8k2";

    private final Cursor cursor;
    private final boolean inList;

    private NumberReader(Cursor cursor, boolean inList) {
        this.cursor = cursor;
        this.inList = inList;
    }

    /**
     * A number as written.
     *
     * @param value without a unit; not too large for a double, and not 0 unless it was written so
     * @param code the marking code, when it was one
     * @param start where it starts in the line
     * @param text how it was written
     */
    record Numeral(BigDecimal value, Optional<MarkingLetter> code, int start, String text) {}

    /** Reads a number and stops behind it. */
    static Numeral read(Cursor cursor) throws TextException {
        return new NumberReader(cursor, false).number();
    }

    /** Reads a number in a list, where a comma ends it. */
    static Numeral readInList(Cursor cursor) throws TextException {
        return new NumberReader(cursor, true).number();
    }

    private Numeral number() throws TextException {
        cursor.skipSpace();
        int start = cursor.position();
        boolean negative = cursor.take("-") || cursor.take("−");
        if (!negative) {
            cursor.take("+");
        }
        int first = cursor.position();
        String whole = digits();
        Optional<MarkingLetter> code = codeLetter(whole);
        String digits;
        int shift = 0;
        if (code.isPresent()) {
            cursor.skip(1);
            String fraction = digits();
            digits = whole + "." + fraction;
            shift = code.get().exponent();
        } else {
            digits = whole + fraction(first);
            if (digits.isEmpty()) {
                cursor.moveTo(start);
                boolean word = Character.isJavaIdentifierStart(cursor.peek());
                String hint = word ? "Only plain values stand here; compute in a calc cell." : "";
                throw TextException.expected(A_NUMBER, cursor, hint);
            }
            shift = exponent();
        }
        refuseGroups(start);
        String text = cursor.from(start);
        BigDecimal value = value(digits, shift, start, text);
        return new Numeral(negative ? value.negate() : value, code, start, text);
    }

    private String digits() {
        int start = cursor.position();
        while (isDigit(cursor.peek())) {
            cursor.skip(1);
        }
        return cursor.from(start);
    }

    private String fraction(int first) throws TextException {
        if (cursor.peek() != '.' || cursor.peek(1) == '.') {
            return "";
        }
        if (!isDigit(cursor.peek(1))) {
            if (cursor.position() == first) {
                return "";
            }
            cursor.skip(1);
            throw new TextException(
                    first,
                    "Found " + Quoted.of(cursor.from(first)) + ", expected a digit after the decimal point",
                    "Leave the point out or write a digit after it.");
        }
        cursor.skip(1);
        return "." + digits();
    }

    /** The power of ten behind the digits, 0 when none is written. */
    private int exponent() throws TextException {
        if (cursor.peek() == 'e' || cursor.peek() == 'E') {
            int sign = isSign(cursor.peek(1)) ? 1 : 0;
            if (isDigit(cursor.peek(1 + sign))) {
                cursor.skip(1);
                return signedWhole();
            }
        }
        int before = cursor.position();
        cursor.skipSpace();
        if (cursor.take("×")) {
            cursor.skipSpace();
            if (cursor.take("10^") && (isDigit(cursor.peek()) || isSign(cursor.peek()) && isDigit(cursor.peek(1)))) {
                return signedWhole();
            }
            if (cursor.take("10") && RaisedDigits.startsAt(cursor)) {
                return RaisedDigits.read(cursor);
            }
            cursor.moveTo(before);
            cursor.skipSpace();
            throw TextException.expected(
                    "a power of ten after '×'", cursor, "Write '1.2e-3', '1.2 × 10^-3' or '1.2 × 10⁻³'.");
        }
        cursor.moveTo(before);
        return 0;
    }

    private int signedWhole() {
        boolean negative = cursor.peek() == '-' || cursor.peek() == '−';
        if (isSign(cursor.peek())) {
            cursor.skip(1);
        }
        int number = 0;
        while (isDigit(cursor.peek())) {
            // Far beyond a double's range already; the bound keeps the count from running over.
            number = Math.min(100_000_000, number * 10 + cursor.peek() - '0');
            cursor.skip(1);
        }
        return negative ? -number : number;
    }

    private Optional<MarkingLetter> codeLetter(String whole) {
        Optional<MarkingLetter> letter = MarkingLetter.of(cursor.peek());
        if (letter.isEmpty()) {
            return letter;
        }
        if (isDigit(cursor.peek(1))) {
            return whole.isEmpty() && letter.get() != MarkingLetter.OHM ? Optional.empty() : letter;
        }
        return !whole.isEmpty() && endsNumber() ? letter : Optional.empty();
    }

    /** Whether a letter behind the digits, as in {@code 470R}, belongs to the number and is not a unit. */
    private boolean endsNumber() {
        char next = cursor.peek(1);
        if (next != '\0' && !Cursor.isSpace(next) && "±+[]~|,.".indexOf(next) < 0) {
            return false;
        }
        if (!MarkingLetter.isUnitToo(cursor.peek())) {
            return true;
        }
        int ahead = 1;
        while (Cursor.isSpace(cursor.peek(ahead))) {
            ahead++;
        }
        // "47K Ω" is a code before its unit, "47K" might be kelvins and "10m" metres.
        return Character.isLetter(cursor.peek(ahead)) || cursor.peek(ahead) == '\u2126';
    }

    private void refuseGroups(int start) throws TextException {
        char next = cursor.peek();
        if (isDigit(cursor.peek(1)) && (next == '_' || next == '\'' || next == '’' || next == ',' && !inList)) {
            throw groups(start, "Write a decimal point, and digits without groups.");
        }
        if (Cursor.isSpace(next)) {
            int before = cursor.position();
            cursor.skipSpace();
            boolean digit = isDigit(cursor.peek()) && !startsReciprocal();
            cursor.moveTo(before);
            if (digit) {
                throw groups(start, inList ? "Put a comma between two numbers." : "Write the digits without spaces.");
            }
        }
    }

    /** Whether a unit such as {@code 1/K} stands here. */
    private boolean startsReciprocal() {
        int ahead = 1;
        while (Cursor.isSpace(cursor.peek(ahead))) {
            ahead++;
        }
        return !inList && cursor.peek() == '1' && cursor.peek(ahead) == '/';
    }

    private TextException groups(int start, String hint) {
        while (isDigit(cursor.peek()) || isDigit(cursor.peek(1)) && !cursor.atEnd()) {
            cursor.skip(1);
        }
        String found = Quoted.of(cursor.from(start));
        return new TextException(start, "Found " + found + ", expected digits without groups or decimal comma", hint);
    }

    private static BigDecimal value(String digits, int shift, int start, String text) throws TextException {
        double rough = Double.parseDouble((digits.startsWith(".") ? "0" : "") + digits + "e" + shift);
        boolean zero = digits.chars().allMatch(c -> c == '0' || c == '.');
        if (Double.isInfinite(rough) || rough == 0 && !zero) {
            throw outOfRange(start, text);
        }
        if (zero) {
            return BigDecimal.ZERO;
        }
        return digits.length() > LONGEST_EXACT || Math.abs(shift) > LONGEST_EXACT
                ? BigDecimal.valueOf(rough)
                : new BigDecimal(digits + "e" + shift);
    }

    static TextException outOfRange(int start, String text) {
        return new TextException(
                start, "Found " + Quoted.of(text) + ", expected a size from 4.9e-324 to 1.8e308 in SI units", "");
    }

    private static boolean isSign(char c) {
        return c == '-' || c == '−' || c == '+';
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }
}
