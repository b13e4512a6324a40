package sill.record.html;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import sill.markup.Markup;
import sill.values.Datum;

/** Values of any kind, in brief as one line and in full. */
final class Values {
    /** Lists up to this length are shown whole in brief. */
    static final int SHORT_LIST = 6;

    private Values() {}

    /** The value on one line; long lists and tables are cut, and say how long they are. */
    static String brief(Datum value, String unit) {
        String text = brief(value);
        boolean numbers = value instanceof Datum.Real
                || value instanceof Datum.Whole
                || value instanceof Datum.Items items && items.items().stream().allMatch(Values::isNumber);
        return numbers && !unit.isEmpty() && !unit.equals("1") ? text + "\u00A0" + unit : text;
    }

    private static String brief(Datum value) {
        if (value instanceof Datum.Real real) {
            return Numbers.brief(real.value());
        }
        if (value instanceof Datum.Items items && !isTable(value)) {
            String first =
                    items.items().stream().limit(SHORT_LIST).map(Values::brief).collect(Collectors.joining(", "));
            int more = items.size() - Math.min(SHORT_LIST, items.items().size());
            return more > 0 ? "[" + first + ", … " + more + " more]" : "[" + first + "]";
        }
        if (isTable(value)) {
            return Heading.counted(rows(value), "row");
        }
        if (value instanceof Datum.Fields fields) {
            return fields.fields().entrySet().stream()
                    .limit(SHORT_LIST)
                    .map(field -> field.getKey() + " " + brief(field.getValue()))
                    .collect(Collectors.joining(", ", "", fields.fields().size() > SHORT_LIST ? ", …" : ""));
        }
        return exact(value);
    }

    /** A single value with every digit. */
    static String exact(Datum value) {
        if (value instanceof Datum.Real real) {
            return Numbers.full(real.value());
        }
        if (value instanceof Datum.Whole whole) {
            return whole.digits();
        }
        if (value instanceof Datum.Truth truth) {
            return truth.value() ? "true" : "false";
        }
        if (value instanceof Datum.Text text) {
            return text.value();
        }
        if (value instanceof Datum.Opaque opaque) {
            return opaque.text();
        }
        return value instanceof Datum.Absent ? "no value" : brief(value);
    }

    /** A given's value in full. */
    static void full(Markup page, Datum value, String unit) {
        full(page, value, unit, Map.of(), "");
    }

    /**
     * A result's value in full.
     *
     * @param componentUnits units of a record's components
     * @param shownFull the engine's own words for a single value, empty when it has none
     */
    static void full(Markup page, Datum value, String unit, Map<String, String> componentUnits, String shownFull) {
        if (value instanceof Datum.Items items && !items.items().isEmpty()) {
            items(page, items, unit, componentUnits);
        } else if (value instanceof Datum.Fields fields && isColumns(fields)) {
            columns(page, fields, componentUnits);
        } else if (value instanceof Datum.Fields fields) {
            page.open("dl", "class", "fields");
            fields.fields().forEach((name, field) -> {
                page.leaf("dt", name);
                page.leaf("dd", withUnit(exact(field), componentUnits.getOrDefault(name, "")));
            });
            page.close();
        } else {
            page.leaf("p", shownFull.isEmpty() ? withUnit(exact(value), unit) : shownFull, "class", "exact");
        }
    }

    private static void items(Markup page, Datum.Items items, String unit, Map<String, String> componentUnits) {
        List<Datum> kept = items.items();
        if (isTable(items)) {
            Set<String> names = new LinkedHashSet<>();
            kept.forEach(item -> names.addAll(((Datum.Fields) item).fields().keySet()));
            tableHead(page, names, componentUnits);
            for (int row = 0; row < kept.size(); row++) {
                Map<String, Datum> fields = ((Datum.Fields) kept.get(row)).fields();
                page.open("tr").leaf("th", Integer.toString(row), "scope", "row");
                names.forEach(name ->
                        page.leaf("td", fields.containsKey(name) ? exact(fields.get(name)) : "", "class", "number"));
                page.close().line();
            }
            page.close().close().close().line();
        } else {
            page.open("ol", "class", "items", "start", "0");
            kept.forEach(item -> page.leaf("li", withUnit(exact(item), isNumber(item) ? unit : "")));
            page.close().line();
        }
        if (items.size() > kept.size()) {
            page.leaf("p", "The record keeps the first " + kept.size() + " of " + items.size() + ".");
        }
    }

    private static void columns(Markup page, Datum.Fields fields, Map<String, String> componentUnits) {
        tableHead(page, fields.fields().keySet(), componentUnits);
        List<Datum.Items> columns =
                fields.fields().values().stream().map(Datum.Items.class::cast).toList();
        int rows =
                columns.stream().mapToInt(column -> column.items().size()).max().orElse(0);
        for (int i = 0; i < rows; i++) {
            int row = i;
            page.open("tr").leaf("th", Integer.toString(row), "scope", "row");
            columns.forEach(column -> page.leaf(
                    "td", row < column.items().size() ? exact(column.items().get(row)) : "", "class", "number"));
            page.close().line();
        }
        page.close().close().close().line();
        int size = columns.stream().mapToInt(Datum.Items::size).max().orElse(0);
        if (size > rows) {
            page.leaf("p", "The record keeps the first " + rows + " of " + size + " rows.");
        }
    }

    private static void tableHead(Markup page, Set<String> names, Map<String, String> units) {
        Tables.openScrolling(page, "Table of values");
        page.open("table", "class", "plain").open("thead").open("tr").leaf("th", "index", "scope", "col");
        for (String name : names) {
            String unit = units.getOrDefault(name, "");
            page.leaf("th", unit.isEmpty() || unit.equals("1") ? name : name + " / " + unit, "scope", "col");
        }
        page.close().close().open("tbody").line();
    }

    /** Whether a value is best read as a table: a list of records, or columns of equal standing. */
    static boolean isTable(Datum value) {
        return value instanceof Datum.Fields fields && isColumns(fields)
                || value instanceof Datum.Items items
                        && !items.items().isEmpty()
                        && items.items().stream().allMatch(item -> item instanceof Datum.Fields);
    }

    /** How many rows a table has. */
    static int rows(Datum table) {
        return table instanceof Datum.Items items
                ? items.size()
                : ((Datum.Fields) table)
                        .fields().values().stream()
                                .mapToInt(column -> ((Datum.Items) column).size())
                                .max()
                                .orElse(0);
    }

    private static boolean isColumns(Datum.Fields fields) {
        return !fields.fields().isEmpty()
                && fields.fields().values().stream().allMatch(field -> field instanceof Datum.Items);
    }

    private static boolean isNumber(Datum value) {
        return value instanceof Datum.Real || value instanceof Datum.Whole;
    }

    private static String withUnit(String text, String unit) {
        return unit.isEmpty() || unit.equals("1") ? text : text + "\u00A0" + unit;
    }
}
