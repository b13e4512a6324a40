package sill.record;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sill.formula.Expression;
import sill.formula.Values;
import sill.stdlib.Series;
import sill.units.Notation;
import sill.units.PrintedQuantity;
import sill.units.Unit;
import sill.values.Datum;
import sill.values.Result;
import sill.worksheet.Cell;
import sill.worksheet.Given;
import sill.worksheet.Worksheet;

/**
 * The values of a sheet, as its record prints them in formulas: a given as it was typed, a result in the unit it is shown in.
 * Temperatures are in kelvins there, since a formula computes with those.
 */
final class KnownValues implements Values {
    /** Above this not every whole number is a {@code double}. */
    private static final double LARGEST_WHOLE = 1L << 53;

    private final Map<String, Entry> entries = new HashMap<>();

    /**
     * A value.
     *
     * @param unit what it is printed in; with a prefix of its own when {@code exact}
     * @param typed whether it has all the digits that the author typed
     */
    private record Entry(Datum value, Unit unit, boolean exact, boolean typed, Map<String, String> componentUnits) {}

    KnownValues(Worksheet worksheet, List<Result> results) {
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Givens givens) {
                givens.givens().forEach(this::given);
            }
        }
        for (Result result : results) {
            boolean exact = !result.shownIn().isEmpty();
            Unit unit = computedWith(Units.of(exact ? result.shownIn() : result.unit()));
            entries.put(result.name(), new Entry(result.value(), unit, exact, false, result.componentUnits()));
        }
    }

    private void given(Given given) {
        if (given.value() instanceof Given.Quantity quantity) {
            Datum value = new Datum.Real(quantity.nominal());
            entries.put(given.name(), new Entry(value, computedWith(quantity.unit()), true, true, Map.of()));
        } else if (given.value() instanceof Given.Quantities quantities) {
            List<Datum> items = quantities.values().stream()
                    .map(value -> (Datum) new Datum.Real(value))
                    .toList();
            Datum value = new Datum.Items(items, items.size());
            entries.put(given.name(), new Entry(value, computedWith(quantities.unit()), true, true, Map.of()));
        }
    }

    /** A unit that a number can be computed with as it stands: kelvin instead of degree Celsius. */
    private static Unit computedWith(Unit unit) {
        return unit.offset() == 0 ? unit : unit.coherent();
    }

    @Override
    public Optional<Expression> inPlaceOf(String name, List<String> path, int digits) {
        Entry entry = entries.get(name);
        Datum value = entry == null ? new Datum.Absent() : entry.value();
        for (String step : path) {
            value = step(value, step);
        }
        if (value instanceof Datum.Real real) {
            return Optional.of(new Expression.Shown(printed(entry, path, real.value(), digits)));
        } else if (value instanceof Datum.Truth truth) {
            return Optional.of(new Expression.Truth(truth.value()));
        } else if (value instanceof Datum.Whole whole) {
            double number = Double.parseDouble(whole.digits());
            return Math.abs(number) <= LARGEST_WHOLE
                    ? Optional.of(new Expression.Shown(Notation.printedPlain(number, Unit.ONE)))
                    : Optional.empty();
        }
        return Optional.empty();
    }

    private static Datum step(Datum value, String step) {
        if (value instanceof Datum.Fields fields) {
            return fields.fields().getOrDefault(step, new Datum.Absent());
        } else if (value instanceof Datum.Items items && step.matches("\\d{1,9}")) {
            int index = Integer.parseInt(step);
            return index < items.items().size() ? items.items().get(index) : new Datum.Absent();
        }
        return new Datum.Absent();
    }

    private static PrintedQuantity printed(Entry entry, List<String> path, double value, int digits) {
        if (entry.typed()) {
            return Notation.printedPlain(value, entry.unit());
        } else if (entry.exact()) {
            return Notation.printedIn(value, entry.unit(), digits);
        }
        String own = path.isEmpty() ? "" : entry.componentUnits().getOrDefault(path.get(0), "");
        return Notation.printed(value, own.isEmpty() ? entry.unit() : Units.of(own), digits);
    }

    @Override
    public PrintedQuantity quantity(double si, String unit, int digits) {
        return Notation.printed(si, Units.of(unit), digits);
    }

    @Override
    public OptionalDouble value(Expression.Call call, List<Double> arguments) {
        if (arguments.size() != 1 || !call.qualifier().startsWith("E")) {
            return OptionalDouble.empty();
        }
        try {
            Series series = Series.valueOf(call.qualifier());
            double x = arguments.get(0);
            return switch (call.name()) {
                case "nearest" -> OptionalDouble.of(series.nearest(x));
                case "atLeast" -> OptionalDouble.of(series.atLeast(x));
                case "atMost" -> OptionalDouble.of(series.atMost(x));
                default -> OptionalDouble.empty();
            };
        } catch (IllegalArgumentException e) {
            // Another constant of that name, or a number that no series holds.
            return OptionalDouble.empty();
        }
    }
}
