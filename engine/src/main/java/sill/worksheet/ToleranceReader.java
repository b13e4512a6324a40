package sill.worksheet;

import sill.units.Unit;
import sill.words.Quoted;
import sill.worksheet.Given.Tolerance;

/** Reads the limits of a given: {@code ± 5 %}, {@code ± 3 mV} or {@code [low .. high]}. */
final class ToleranceReader {
    private ToleranceReader() {}

    static Tolerance read(Cursor cursor, WrittenQuantity nominal) throws TextException {
        cursor.skipSpace();
        if (takePlusMinus(cursor)) {
            return distance(cursor, nominal);
        }
        if (cursor.peek() == '[') {
            return range(cursor, nominal);
        }
        return new Tolerance.None();
    }

    static boolean takePlusMinus(Cursor cursor) {
        return cursor.take("±") || cursor.take("+/-");
    }

    /** Reads a distance on either side of a value, relative or absolute. */
    static Tolerance distance(Cursor cursor, WrittenQuantity about) throws TextException {
        WrittenQuantity distance = WrittenQuantity.read(cursor);
        if (distance.number().signum() < 0) {
            throw new TextException(
                    distance.start(),
                    "Found " + Quoted.of(distance.text()) + ", expected a tolerance of 0 or more",
                    "Write it without its sign; limits on one side are '[low .. high]'.");
        }
        Unit unit = distance.unit();
        if (isFraction(about.unit()) && !distance.isBareZero()) {
            throw new TextException(
                    distance.start(),
                    "Found " + Quoted.of(distance.text()) + " on a value in "
                            + about.unit().symbol() + ", expected limits that read one way only",
                    "Write both limits: '[48 " + about.unit().symbol() + " .. 52 "
                            + about.unit().symbol() + "]'.");
        }
        if (isFraction(unit)) {
            return relative(distance, about);
        }
        if (!distance.fits(about.unit())) {
            String expected = about.bare()
                    ? "a number without unit or in %"
                    : "% or a unit that fits " + about.unit().symbol();
            throw new TextException(
                    distance.start(),
                    "Found the tolerance " + Quoted.of(distance.text()) + ", expected " + expected,
                    distance.bare()
                            ? "Write " + Quoted.of(distance.text() + " %") + " or "
                                    + Quoted.of(
                                            distance.text() + " " + about.unit().symbol()) + "."
                            : "");
        }
        // A distance has no zero point: 2 °C between two temperatures are 2 K.
        return new Tolerance.Absolute(Decimals.sum(distance.si(), -unit.offset()));
    }

    private static Tolerance relative(WrittenQuantity fraction, WrittenQuantity about) throws TextException {
        Unit unit = about.unit();
        if (unit.offset() != 0) {
            throw new TextException(
                    fraction.start(),
                    "Found " + Quoted.of(fraction.text()) + " of a temperature in " + unit.symbol()
                            + ", expected a difference",
                    "Write '± 2 " + unit.symbol() + "' or '± 2 K'.");
        }
        return new Tolerance.Relative(fraction.si());
    }

    private static boolean isFraction(Unit unit) {
        return unit.symbol().equals("%") || unit.symbol().equals("ppm");
    }

    private static Tolerance range(Cursor cursor, WrittenQuantity nominal) throws TextException {
        int open = cursor.position();
        cursor.skip(1);
        Window window = Window.read(cursor, open);
        cursor.skipSpace();
        if (!cursor.take("]")) {
            throw cursor.atEnd()
                    ? new TextException(open, "Found '[' without its ']', expected '[low .. high]'", "")
                    : TextException.expected("']'", cursor, "");
        }
        for (WrittenQuantity limit : new WrittenQuantity[] {window.low(), window.high()}) {
            if (!limit.fits(nominal.unit())) {
                throw new TextException(
                        limit.start(),
                        "Found the limit " + Quoted.of(limit.text()) + ", expected a unit that fits "
                                + nominal.unit().symbol(),
                        limit.bare()
                                ? "Each limit carries its unit."
                                : nominal.bare() ? "Give the nominal value its unit too." : "");
            }
            if (limit.isBareZero() && nominal.unit().offset() != 0) {
                throw Window.zeroWithoutScale(limit, nominal.unit());
            }
        }
        if (nominal.si() < window.low().si() || nominal.si() > window.high().si()) {
            throw new TextException(
                    nominal.start(),
                    "Found the nominal value " + Quoted.of(nominal.text()) + " outside its limits, expected "
                            + "it from " + window.low().text() + " to "
                            + window.high().text(),
                    "");
        }
        return new Tolerance.Range(window.low().si(), window.high().si());
    }
}
