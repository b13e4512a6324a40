package sill.worksheet;

import java.math.BigDecimal;
import java.util.Optional;
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
        Unit unit = unit(symbol, start);
        Optional<MarkingLetter> code = numeral.code();
        if (code.isEmpty()) {
            if (symbol.equals("K") && start == numeral.start() + numeral.text().length()) {
                String digits = numeral.text();
                throw new TextException(
                        numeral.start(),
                        "Found " + Quoted.of(digits + symbol) + ", expected a clear unit: K may be kilo or kelvin",
                        "Write '" + digits + " kΩ', '" + digits + "e3' or '" + digits + " K'.");
            }
            return unit;
        }
        String expected = code.get().unit();
        if (!unit.symbol().equals(expected)) {
            String digits = numeral.value()
                    .scaleByPowerOfTen(-code.get().exponent())
                    .stripTrailingZeros()
                    .toPlainString();
            throw new TextException(
                    numeral.start(),
                    "Found the marking code " + Quoted.of(numeral.text()) + " before " + Quoted.of(unit.symbol())
                            + ", expected " + expected + " or no unit",
                    "Write the number out, such as '" + digits + " "
                            + code.get().prefix() + expected + "'.");
        }
        return unit(code.get().prefix() + expected, start);
    }

    private static Unit unit(String symbol, int start) throws TextException {
        try {
            return Unit.parse(symbol);
        } catch (UnitException e) {
            throw new TextException(start + e.position(), e.getMessage(), mend(symbol, e.hint()));
        }
    }

    private static String mend(String symbol, String hint) {
        if (symbol.contains("//")) {
            return "A remark follows '|' here.";
        }
        for (int at = 0; at + 1 < symbol.length(); at++) {
            if ("+-−".indexOf(symbol.charAt(at)) >= 0 && "0123456789 /-".indexOf(symbol.charAt(at + 1)) >= 0) {
                return "Write '± 5 %' for equal limits and '[4.8 V .. 5.1 V]' for others.";
            }
        }
        return hint;
    }

    private static boolean endsUnit(Cursor cursor) {
        return "±[]~|".indexOf(cursor.peek()) >= 0 || cursor.startsWith("+/-") || cursor.startsWith("..");
    }
}
