package sill.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import sill.record.DesignRecord.GivenEntry;
import sill.units.Notation;
import sill.units.Unit;
import sill.values.Datum;
import sill.worksheet.Cell;
import sill.worksheet.Given;
import sill.worksheet.Given.Distribution;
import sill.worksheet.Given.Quantity;
import sill.worksheet.Given.Tolerance;
import sill.worksheet.Worksheet;

/** Writes the givens of a worksheet as a record has them. */
final class GivenEntries {
    private GivenEntries() {}

    static List<GivenEntry> of(Worksheet worksheet) {
        List<GivenEntry> entries = new ArrayList<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Givens givens) {
                int index = 0;
                for (Given given : givens.givens()) {
                    index++;
                    entries.add(entry(given, cell.number() + "." + index));
                }
            }
        }
        return entries;
    }

    private static GivenEntry entry(Given given, String at) {
        if (given.value() instanceof Quantity quantity) {
            return quantity(given, quantity, at);
        } else if (given.value() instanceof Given.Quantities quantities) {
            List<Datum> items = quantities.values().stream()
                    .map(value -> (Datum) new Datum.Real(value))
                    .toList();
            return plain(
                    given,
                    new Datum.Items(items, items.size()),
                    quantities.unit().coherent().symbol(),
                    list(quantities),
                    at);
        } else if (given.value() instanceof Given.Text text) {
            return plain(given, new Datum.Text(text.text()), "", text.text(), at);
        }
        String path = ((Given.DataFile) given.value()).path();
        return plain(given, new Datum.Opaque(path), "", path, at);
    }

    private static GivenEntry plain(Given given, Datum value, String unit, String shown, String at) {
        return new GivenEntry(
                given.name(),
                value,
                unit,
                shown,
                Optional.empty(),
                Optional.empty(),
                "",
                "",
                given.remark(),
                at,
                given.line());
    }

    private static GivenEntry quantity(Given given, Quantity quantity, String at) {
        boolean limits = quantity.hasLimits();
        return new GivenEntry(
                given.name(),
                new Datum.Real(quantity.nominal()),
                quantity.unit().coherent().symbol(),
                Notation.plain(quantity.nominal(), quantity.unit()),
                limits ? Optional.of(quantity.low()) : Optional.empty(),
                limits ? Optional.of(quantity.high()) : Optional.empty(),
                limits(quantity),
                limits ? distribution(quantity.distribution()) : "",
                given.remark(),
                at,
                given.line());
    }

    private static String list(Given.Quantities quantities) {
        Unit unit = quantities.unit();
        // The unit stands once, behind the list.
        Unit bare = Units.withoutSymbol(unit);
        String numbers = quantities.values().stream()
                .map(value -> Notation.plain(value, bare))
                .collect(Collectors.joining(", "));
        return "[" + numbers + "]" + (unit.symbol().equals("1") ? "" : Notation.SPACE + unit.symbol());
    }

    private static String limits(Quantity quantity) {
        Tolerance tolerance = quantity.tolerance();
        String span = Notation.shown(quantity.low(), quantity.unit()) + " .. "
                + Notation.shown(quantity.high(), quantity.unit());
        if (tolerance instanceof Tolerance.Relative relative) {
            return "±" + Notation.SPACE + Notation.plain(relative.fraction(), Units.of("%")) + " (" + span + ")";
        } else if (tolerance instanceof Tolerance.Absolute absolute) {
            Unit unit = quantity.unit();
            // A distance between temperatures is a number of kelvins.
            Unit distance = unit.offset() == 0 ? unit : unit.coherent();
            return "±" + Notation.SPACE + Notation.plain(absolute.distance(), distance) + " (" + span + ")";
        } else if (tolerance instanceof Tolerance.Range range) {
            return Notation.plain(range.from(), quantity.unit()) + " .. " + Notation.plain(range.to(), quantity.unit());
        }
        return "";
    }

    private static String distribution(Distribution distribution) {
        if (distribution instanceof Distribution.Normal normal) {
            return "normal " + Notation.plain(normal.k(), Unit.ONE);
        }
        return distribution instanceof Distribution.Triangular ? "triangular" : "uniform";
    }
}
