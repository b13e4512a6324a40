package sill.worksheet;

import java.math.BigDecimal;
import sill.units.Unit;
import sill.units.UnitException;
import sill.words.Quoted;
import sill.worksheet.NumberReader.Numeral;

/**
 * A number with its unit as it stands in a line.
 *
 * @param si in coherent SI
 * @param number without its unit
 * @param unit as written; for a marking code with a unit, the unit with the code's prefix ({@code kΩ} for {@code 8k2 Ω})
 * @param bare whether no unit was written
 * @param start where it starts in the line
 * @param text how it was written
 */
record WrittenQuantity(double si, BigDecimal number, Unit unit, boolean bare, int start, String text) {

    /** A bare 0 fits every dimension. */
    boolean isBareZero() {
        return bare && number.signum() == 0;
    }

    /** Whether it can stand beside a value in another unit; 2 beside 50 % or 45° might mean 2 of those or 2 as it stands. */
    boolean fits(Unit other) {
        boolean unclear = bare && other.factor() != 1;
        return isBareZero() || unit.dimension().equals(other.dimension()) && !unclear;
    }

    /** Reads a number and its unit, up to the next sign that no unit contains. */
    static WrittenQuantity read(Cursor cursor) throws TextException {
        Numeral numeral = NumberReader.read(cursor);
        cursor.skipSpace();
        int start = cursor.position();
        while (!cursor.atEnd() && !endsUnit(cursor)) {
            cursor.skip(1);
        }
        String symbol = cursor.between(start, cursor.position());
        Unit unit = symbol.isEmpty() ? Unit.ONE : unit(symbol, start, numeral);
        BigDecimal number = numeral.value();
        if (!symbol.isEmpty() && numeral.code().isPresent()) {
            number = number.scaleByPowerOfTen(-numeral.code().get().exponent());
        }
        String text = cursor.between(numeral.start(), cursor.position());
        return new WrittenQuantity(inSi(number, unit, numeral), number, unit, symbol.isEmpty(), numeral.start(), text);
    }

    /** Reads the unit that stands behind a list. */
    static Unit readUnit(Cursor cursor) throws TextException {
        cursor.skipSpace();
        int start = cursor.position();
        while (!cursor.atEnd() && !endsUnit(cursor)) {
            cursor.skip(1);
        }
        String symbol = cursor.between(start, cursor.position());
        return symbol.isEmpty() ? Unit.ONE : unit(symbol, start);
    }

    static double inSi(BigDecimal number, Unit unit, Numeral numeral) throws TextException {
        double si = unit.toSi(number);
        if (Double.isInfinite(si) || si == 0 && number.signum() != 0 && unit.offset() == 0) {
            throw NumberReader.outOfRange(numeral.start(), numeral.text());
        }
        return si;
    }

    private static Unit unit(String symbol, int start, Numeral numeral) throws TextException {
        boolean glued = start == numeral.start() + numeral.text().length();
        if (numeral.code().isPresent()) {
            return MarkingCodes.unit(numeral, symbol, start, glued);
        }
        if (glued && symbol.equals("K")) {
            String digits = numeral.text();
            throw new TextException(
                    numeral.start(),
                    "Found " + Quoted.of(digits + symbol) + ", expected a clear unit: K may be kilo or kelvin",
                    "Write '" + digits + " kΩ', '" + digits + "e3' or '" + digits + " K'.");
        }
        return unit(symbol, start);
    }

    static Unit unit(String symbol, int start) throws TextException {
        int comment = symbol.indexOf("//");
        if (comment >= 0) {
            throw new TextException(
                    start + comment,
                    "Found " + Quoted.of(symbol.substring(comment)) + ", expected the end of the line",
                    "A remark follows '|' here.");
        }
        try {
            return Unit.parse(symbol);
        } catch (UnitException e) {
            throw new TextException(start + e.position(), e.getMessage(), mend(symbol, e.hint()));
        }
    }

    /** What seems to be meant when something else stands where the unit does. */
    private static String mend(String symbol, String hint) {
        if (symbol.charAt(0) == '/' && symbol.length() > 1 && Character.isLetter(symbol.charAt(1))) {
            return "Write '1/K' or 'K^-1'.";
        }
        if ("*/+-−".indexOf(symbol.charAt(0)) >= 0) {
            return "Only a plain value stands here; compute in a calc cell.";
        }
        if (symbol.contains(" to ")) {
            return "Write two limits as 'low .. high'.";
        }
        boolean signed = false;
        for (int at = 1; at < symbol.length(); at++) {
            signed |= "+-−".indexOf(symbol.charAt(at)) >= 0 && "^(".indexOf(symbol.charAt(at - 1)) < 0;
            if (Character.isDigit(symbol.charAt(at)) && (signed || Cursor.isSpace(symbol.charAt(at - 1)))) {
                return "Write '± 5 %' for equal limits and '[4.8 V .. 5.1 V]' for others.";
            }
        }
        return hint;
    }

    private static boolean endsUnit(Cursor cursor) {
        return "±[]~|…".indexOf(cursor.peek()) >= 0 || cursor.startsWith("+/-") || cursor.startsWith("..");
    }
}
