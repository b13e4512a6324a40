package sill.worksheet;

import sill.words.Quoted;
import sill.worksheet.Check.Basis;
import sill.worksheet.Check.Limit;
import sill.worksheet.Check.Requirement;
import sill.worksheet.Given.Tolerance;

/** Reads a requirement and its basis, from the requirement's first word on. */
final class RequirementReader {
    private static final String BASIS = "'at worst-case', 'in 99.7 %', '| remark' or the end of the line";

    private final Cursor cursor;

    private RequirementReader(Cursor cursor) {
        this.cursor = cursor;
    }

    /** A requirement and what it is judged on. */
    record Judged(Requirement requirement, Basis basis) {}

    static Judged read(Cursor cursor) throws TextException {
        int basis = basisPlace(cursor);
        Cursor upToBasis = cursor.part(cursor.position(), basis);
        Requirement requirement = new RequirementReader(upToBasis).requirement();
        upToBasis.skipSpace();
        if (!upToBasis.atEnd()) {
            String hint = upToBasis.startsWith("//") ? "A remark follows '|' here." : "";
            throw TextException.expected(BASIS, upToBasis, hint);
        }
        return new Judged(requirement, new RequirementReader(cursor.part(basis, cursor.end())).basis());
    }

    /** The place of the word {@code at} or {@code in} that starts the basis; the end when there is none. */
    private static int basisPlace(Cursor cursor) {
        Cursor ahead = cursor.part(cursor.position(), cursor.end());
        ahead.skip(1);
        boolean afterSpace = false;
        while (!ahead.atEnd()) {
            int place = ahead.position();
            if (afterSpace && (ahead.takeWord("at") || ahead.takeWord("in"))) {
                return place;
            }
            ahead.moveTo(place);
            afterSpace = Cursor.isSpace(ahead.peek());
            ahead.skip(1);
        }
        return cursor.end();
    }

    private Requirement requirement() throws TextException {
        if (cursor.takeWord("holds")) {
            return new Requirement.Holds();
        }
        if (cursor.takeWord("within")) {
            cursor.skipSpace();
            if (cursor.peek() == '[') {
                throw TextException.expected("two limits without brackets", cursor, "Write 'within low .. high'.");
            }
            Window window = Window.read(cursor, cursor.position());
            return new Requirement.Within(limit(window.low(), window.high()), limit(window.high(), window.low()));
        }
        if (cursor.takeWord("equals")) {
            return equalTo();
        }
        cursor.takeWord("at");
        cursor.skipSpace();
        if (cursor.takeWord("least")) {
            return new Requirement.AtLeast(limit(WrittenQuantity.read(cursor)));
        }
        cursor.takeWord("most");
        return new Requirement.AtMost(limit(WrittenQuantity.read(cursor)));
    }

    private Requirement equalTo() throws TextException {
        WrittenQuantity value = WrittenQuantity.read(cursor);
        cursor.skipSpace();
        if (!ToleranceReader.takePlusMinus(cursor)) {
            throw TextException.expected(
                    "'± distance' after 'equals'", cursor, "Computed numbers rarely meet: write 'equals 5 V ± 1 mV'.");
        }
        Tolerance tolerance = ToleranceReader.distance(cursor, value);
        double distance = tolerance instanceof Tolerance.Relative relative
                ? Decimals.product(relative.fraction(), Math.abs(value.si()))
                : tolerance.high(0);
        return new Requirement.EqualTo(limit(value), distance);
    }

    private Basis basis() throws TextException {
        if (cursor.atEnd()) {
            return new Basis.Nominal();
        }
        if (cursor.takeWord("in")) {
            return share();
        }
        cursor.takeWord("at");
        cursor.skipSpace();
        if (!cursor.take("worst-case")) {
            boolean second = cursor.startsWith("least") || cursor.startsWith("most");
            String hint = second
                    ? "One line, one requirement; two limits are 'within low .. high'."
                    : "Write 'at worst-case'.";
            throw TextException.expected("'worst-case' after 'at'", cursor, hint);
        }
        cursor.skipSpace();
        if (!cursor.atEnd()) {
            throw TextException.expected("'| remark' or the end of the line", cursor, "");
        }
        return new Basis.WorstCase();
    }

    private Basis share() throws TextException {
        WrittenQuantity share = WrittenQuantity.read(cursor);
        if (!share.unit().symbol().equals("%")) {
            throw new TextException(
                    share.start(),
                    "Found the share " + Quoted.of(share.text()) + ", expected a percentage",
                    "Write 'in 99.7 %'.");
        }
        if (!(share.si() > 0 && share.si() < 1)) {
            throw new TextException(
                    share.start(),
                    "Found the share " + Quoted.of(share.text()) + ", expected one above 0 % and below 100 %",
                    share.si() == 1 ? "No number of samples shows 100 %; write 'at worst-case'." : "");
        }
        cursor.skipSpace();
        if (!cursor.atEnd()) {
            throw TextException.expected("'| remark' or the end of the line", cursor, "");
        }
        return new Basis.Share(share.si());
    }

    private static Limit limit(WrittenQuantity limit) {
        return new Limit(limit.si(), limit.unit());
    }

    /** A limit; a bare 0 takes the unit of the other one. */
    private static Limit limit(WrittenQuantity limit, WrittenQuantity other) {
        return new Limit(limit.si(), limit.isBareZero() ? other.unit() : limit.unit());
    }
}
