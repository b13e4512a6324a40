package sill.worksheet;

import java.util.ArrayList;
import java.util.List;
import sill.units.Unit;
import sill.worksheet.Given.Distribution;
import sill.worksheet.Given.Tolerance;
import sill.worksheet.NumberReader.Numeral;

/** Reads what stands behind {@code name =}, up to the remark. */
final class GivenValue {
    private GivenValue() {}

    static Given.Value read(Cursor cursor) throws TextException {
        cursor.skipSpace();
        Given.Value value;
        if (cursor.peek() == '"') {
            value = new Given.Text(QuotedText.read(cursor));
        } else if (cursor.takeWord("file")) {
            value = new Given.DataFile(FilePath.read(cursor));
        } else if (cursor.peek() == '[') {
            value = quantities(cursor);
        } else if (!cursor.atEnd() && "'‘’“”„«»".indexOf(cursor.peek()) >= 0) {
            throw TextException.expected("a text in double quotes", cursor, "Write '\"metal film\"'.");
        } else {
            return quantity(cursor);
        }
        cursor.skipSpace();
        if (!cursor.atEnd() && cursor.peek() != '|') {
            boolean limits = "±[~+".indexOf(cursor.peek()) >= 0;
            String hint = limits ? "Only a single number has limits and a distribution." : "";
            throw TextException.expected("'| remark' or the end of the line", cursor, hint);
        }
        return value;
    }

    private static Given.Quantity quantity(Cursor cursor) throws TextException {
        WrittenQuantity nominal = WrittenQuantity.read(cursor);
        Tolerance tolerance = ToleranceReader.read(cursor, nominal);
        Distribution distribution = DistributionReader.read(cursor, nominal.si(), tolerance);
        cursor.skipSpace();
        if (!cursor.atEnd() && cursor.peek() != '|') {
            throw TextException.expected(
                    "'± 5 %', '[low .. high]', '~ distribution', '| remark' or the end of the line",
                    cursor, "Limits come before the distribution, and each once.");
        }
        return new Given.Quantity(nominal.si(), nominal.unit(), tolerance, distribution);
    }

    private static Given.Quantities quantities(Cursor cursor) throws TextException {
        int open = cursor.position();
        cursor.skip(1);
        List<Numeral> numbers = new ArrayList<>();
        do {
            numbers.add(NumberReader.readInList(cursor));
            cursor.skipSpace();
        } while (cursor.take(","));
        if (!cursor.take("]")) {
            throw unclosed(cursor, open);
        }
        cursor.skipSpace();
        int start = cursor.position();
        Unit unit = WrittenQuantity.readUnit(cursor);
        List<Double> values = new ArrayList<>(numbers.size());
        for (Numeral number : numbers) {
            if (number.code().isPresent() && !unit.equals(Unit.ONE)) {
                MarkingCodes.unit(number, unit.symbol(), start, false);
            }
            values.add(WrittenQuantity.inSi(number.value(), unit, number));
        }
        return new Given.Quantities(values, unit);
    }

    private static TextException unclosed(Cursor cursor, int open) {
        if (cursor.atEnd()) {
            return new TextException(open, "Found '[' without its ']', expected '[1, 2, 3] unit'", "");
        }
        String hint = cursor.rest().contains("..")
                ? "A nominal value comes before its limits, such as '1.5 V [1.2 V .. 1.8 V]'."
                : "The unit of a list comes once, behind ']'.";
        return TextException.expected("',' or ']'", cursor, hint);
    }
}
