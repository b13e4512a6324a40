package sill.stdlib;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A data file's columns, as a given {@code name = file "…"} brings them. Numbers are in coherent SI when the header names
 * a unit in brackets, as in {@code vIn [mV]}; else as they stand in the file. An empty field of a number column is NaN.
 */
public final class Table {
    private final Map<String, double[]> numbers;
    private final Map<String, List<String>> texts;
    private final int rows;

    /**
     * Makes a table; worksheets get theirs from a given.
     *
     * @param columns column name to its values: {@code double[]} for numbers, {@code List<String>} for text, all of one
     *     length
     * @throws IllegalArgumentException when the columns differ in length or hold something else
     */
    public Table(Map<String, ?> columns) {
        Map<String, double[]> numberColumns = new LinkedHashMap<>();
        Map<String, List<String>> textColumns = new LinkedHashMap<>();
        int length = -1;
        for (Map.Entry<String, ?> column : columns.entrySet()) {
            int size;
            if (column.getValue() instanceof double[] values) {
                numberColumns.put(column.getKey(), values.clone());
                size = values.length;
            } else if (column.getValue() instanceof List<?> values
                    && values.stream().allMatch(String.class::isInstance)) {
                List<String> strings = values.stream().map(String.class::cast).toList();
                textColumns.put(column.getKey(), strings);
                size = strings.size();
            } else {
                throw new IllegalArgumentException(
                        "column \"" + column.getKey() + "\" must be double[] or a list of String");
            }
            if (length >= 0 && length != size) {
                throw new IllegalArgumentException("column \"" + column.getKey() + "\" must have " + length
                        + " rows like the columns before it, got " + size);
            }
            length = size;
        }
        numbers = numberColumns;
        texts = textColumns;
        rows = Math.max(length, 0);
    }

    /** The number of rows, the header not counted. */
    public int rows() {
        return rows;
    }

    /** The names of the number columns, in the file's order. */
    public List<String> numberColumns() {
        return List.copyOf(numbers.keySet());
    }

    /** The names of the text columns, in the file's order. */
    public List<String> textColumns() {
        return List.copyOf(texts.keySet());
    }

    /**
     * A number column.
     *
     * @param name the header's name, without its unit
     * @return the values, one a row; NaN where the field is empty
     * @throws IllegalArgumentException when no number column has that name
     */
    @Unit("?")
    public double[] column(String name) {
        double[] values = numbers.get(name);
        if (values == null && texts.containsKey(name)) {
            throw new IllegalArgumentException(
                    "column \"" + name + "\" holds text, not numbers; text(\"" + name + "\") gives it");
        }
        if (values == null) {
            throw new IllegalArgumentException("column must be one of " + numbers.keySet() + ", got \"" + name + "\"");
        }
        return values.clone();
    }

    /**
     * A text column.
     *
     * @param name the header's name
     * @return the fields, one a row
     * @throws IllegalArgumentException when no text column has that name
     */
    public List<String> text(String name) {
        List<String> values = texts.get(name);
        if (values == null) {
            throw new IllegalArgumentException(
                    "text column must be one of " + texts.keySet() + ", got \"" + name + "\"");
        }
        return values;
    }

    /** The size and the columns' names, such as {@code Table of 3 rows: numbers [t, vIn], texts [note]}. */
    @Override
    public String toString() {
        return "Table of " + rows + " rows: numbers " + numbers.keySet() + ", texts " + texts.keySet();
    }
}
