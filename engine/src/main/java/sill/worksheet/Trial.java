package sill.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import sill.units.Notation;
import sill.words.NearestWord;
import sill.words.Quoted;
import sill.worksheet.Given.Quantity;
import sill.worksheet.Given.Tolerance;

/**
 * Trial values: givens overridden for one run. The tolerance stays as stated: a relative one follows the trial value, an
 * absolute one keeps its distance, a range stays where it is and must hold the trial value.
 */
public final class Trial {
    private Trial() {}

    /**
     * The worksheet with one given overridden.
     *
     * @param name the given's name
     * @param value what the worksheet would say behind {@code =}, without limits; for a text, the text without quotes
     * @throws IllegalArgumentException if there is no such given or the value does not fit it; the message says what was
     *     found, what was expected and how to mend it
     */
    public static Worksheet override(Worksheet sheet, String name, String value) {
        boolean known = false;
        List<Cell> cells = new ArrayList<>();
        for (Cell cell : sheet.cells()) {
            if (cell instanceof Cell.Givens those) {
                List<Given> givens = new ArrayList<>();
                for (Given given : those.givens()) {
                    boolean meant = given.name().equals(name);
                    known |= meant;
                    givens.add(meant ? overridden(given, value) : given);
                }
                cells.add(new Cell.Givens(
                        those.number(), those.caption(), those.line(), those.source(), givens, those.wrong()));
            } else {
                cells.add(cell);
            }
        }
        if (!known) {
            String hint = NearestWord.hint(name, names(sheet).keySet(), "");
            throw new IllegalArgumentException(
                    sentence("Found the trial name " + Quoted.of(name) + ", expected a given of the worksheet", hint));
        }
        return new Worksheet(sheet.text(), sheet.titleBlock(), cells, sheet.problems());
    }

    private static Map<String, Given> names(Worksheet sheet) {
        return sheet.cells().stream()
                .filter(Cell.Givens.class::isInstance)
                .flatMap(cell -> ((Cell.Givens) cell).givens().stream())
                .collect(Collectors.toMap(Given::name, given -> given, (a, b) -> a, java.util.LinkedHashMap::new));
    }

    private static Given overridden(Given given, String text) {
        try {
            return new Given(given.name(), given.line(), given.column(), value(given.value(), text), given.remark());
        } catch (TextException slip) {
            throw new IllegalArgumentException(
                    sentence("Trial value of '" + given.name() + "': " + slip.getMessage(), slip.hint()));
        }
    }

    private static Given.Value value(Given.Value before, String text) throws TextException {
        if (before instanceof Given.Text) {
            return new Given.Text(text);
        }
        Cursor cursor = new Cursor(text);
        if (before instanceof Quantity quantity) {
            return quantity(quantity, cursor);
        }
        Given.Value value = GivenValue.read(cursor);
        boolean fits = value.getClass() == before.getClass()
                && !(value instanceof Given.Quantities list
                        && before instanceof Given.Quantities old
                        && !list.unit().dimension().equals(old.unit().dimension()));
        if (!fits || !cursor.atEnd()) {
            throw new TextException(0, "Found " + Quoted.of(text) + ", expected a value like the worksheet's", "");
        }
        return value;
    }

    private static Quantity quantity(Quantity before, Cursor cursor) throws TextException {
        WrittenQuantity written = WrittenQuantity.read(cursor);
        if (!cursor.atEnd()) {
            throw TextException.expected(
                    "the end of the trial value", cursor, "Its tolerance stays as the worksheet says.");
        }
        if (!written.fits(before.unit())
                || written.isBareZero() && before.unit().offset() != 0) {
            throw new TextException(
                    0,
                    "Found " + Quoted.of(written.text()) + ", expected a unit that fits "
                            + before.unit().symbol(),
                    "");
        }
        boolean outside = written.si() < before.low() || written.si() > before.high();
        if (before.tolerance() instanceof Tolerance.Range && outside) {
            throw new TextException(
                    0,
                    "Found " + Quoted.of(written.text()) + ", expected a value within its limits, from "
                            + Notation.plain(before.low(), before.unit()) + " to "
                            + Notation.plain(before.high(), before.unit()),
                    "Change the limits in the worksheet.");
        }
        return new Quantity(
                written.si(),
                written.isBareZero() ? before.unit() : written.unit(),
                before.tolerance(),
                before.distribution());
    }

    private static String sentence(String message, String hint) {
        return hint.isEmpty() ? message : message + ". " + hint;
    }
}
