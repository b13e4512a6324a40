package sill.record;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import sill.units.Notation;
import sill.units.Unit;
import sill.values.Datum;
import sill.values.Result;

/**
 * A result as a record prints it.
 *
 * @param text with unit and prefix, four significant digits
 * @param full with every digit
 * @param components a record's components, each as {@code text}
 */
record ShownValue(String text, String full, Map<String, String> components) {
    private static final int ITEMS_IN_LINE = 6;
    private static final int LONGEST_TEXT = 200;

    static ShownValue of(Result result) {
        Unit unit = Units.of(result.unit());
        // A unit that the caption asks for is taken as it is; else the prefix follows the number.
        Unit exact = result.shownIn().isEmpty() ? null : Units.of(result.shownIn());
        Map<String, String> components = new LinkedHashMap<>();
        if (result.value() instanceof Datum.Fields fields) {
            fields.fields().forEach((name, value) -> {
                Unit own = Units.of(result.componentUnits().getOrDefault(name, result.unit()));
                components.put(name, new Writer(own, exact, false).text(value));
            });
        }
        return new ShownValue(
                line(result.value(), components, new Writer(unit, exact, false)),
                line(result.value(), Map.of(), new Writer(unit, exact, true)),
                components);
    }

    /** How a result's text, or that of one of its components, would read with another value. */
    static String of(Result result, String component, Datum value) {
        Unit exact = result.shownIn().isEmpty() ? null : Units.of(result.shownIn());
        Unit own = Units.of(result.componentUnits().getOrDefault(component, result.unit()));
        return new Writer(own, exact, false).text(value);
    }

    /** A number with its unit, as a check prints it. */
    static String of(Datum value, Unit unit) {
        return new Writer(unit, null, false).text(value);
    }

    private static String line(Datum value, Map<String, String> components, Writer writer) {
        if (components.isEmpty()) {
            return writer.text(value);
        }
        return components.entrySet().stream()
                .map(component -> component.getKey() + " " + component.getValue())
                .collect(Collectors.joining(", "));
    }

    /** Writes values of one unit. */
    private record Writer(Unit unit, Unit exact, boolean full) {
        String text(Datum value) {
            if (value instanceof Datum.Real real) {
                return number(real.value());
            } else if (value instanceof Datum.Whole whole) {
                return whole.digits().replace('-', Notation.MINUS);
            } else if (value instanceof Datum.Truth truth) {
                return String.valueOf(truth.value());
            } else if (value instanceof Datum.Text text) {
                return cut(text.value());
            } else if (value instanceof Datum.Items items) {
                return items(items);
            } else if (value instanceof Datum.Fields fields) {
                return fields.fields().entrySet().stream()
                        .limit(full ? Long.MAX_VALUE : ITEMS_IN_LINE)
                        .map(field -> field.getKey() + " " + text(field.getValue()))
                        .collect(Collectors.joining(", "));
            } else if (value instanceof Datum.Opaque opaque) {
                return cut(opaque.text());
            }
            return "no value";
        }

        private String number(double value) {
            if (full) {
                return exact == null ? Notation.full(value, unit) : Notation.plain(value, exact);
            }
            return exact == null ? Notation.shown(value, unit) : Notation.shownIn(value, exact);
        }

        private String items(Datum.Items items) {
            List<Datum> first = items.items();
            boolean once = exact != null && first.stream().allMatch(Datum.Real.class::isInstance);
            Writer each = once ? new Writer(unit, Units.withoutSymbol(exact), full) : this;
            String symbol = once && !exact.symbol().equals("1") ? Notation.SPACE + exact.symbol() : "";
            boolean all = full || items.size() <= ITEMS_IN_LINE;
            String listed = first.stream()
                    .limit(all ? Long.MAX_VALUE : ITEMS_IN_LINE)
                    .map(each::element)
                    .collect(Collectors.joining(", "));
            boolean whole = all && items.size() == first.size();
            return whole ? listed + symbol : listed + ", …" + symbol + " (" + items.size() + " values)";
        }

        /** A value inside a list; one of several parts is held together. */
        private String element(Datum value) {
            if (value instanceof Datum.Items) {
                return "[" + text(value) + "]";
            }
            return value instanceof Datum.Fields ? "(" + text(value) + ")" : text(value);
        }

        private String cut(String text) {
            return full || text.length() <= LONGEST_TEXT ? text : text.substring(0, LONGEST_TEXT) + "…";
        }
    }
}
