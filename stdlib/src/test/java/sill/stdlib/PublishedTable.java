package sill.stdlib;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A data file of published values: {@code #} lines, of which one starts with {@code # source:}; a line of column names; a
 * line for each row; fields apart by {@code |}.
 */
final class PublishedTable {
    private PublishedTable() {}

    /** A row and where it stands. */
    record Row(String place, Map<String, String> fields) {
        String get(String column) {
            String field = fields.get(column);
            if (field == null) {
                throw new IllegalArgumentException(place + ": no column \"" + column + "\" among " + fields.keySet());
            }
            return field;
        }

        @Override
        public String toString() {
            return place + " " + fields.values();
        }
    }

    static List<Row> read(String file) {
        try (InputStream in = PublishedTable.class.getResourceAsStream("/published/" + file)) {
            if (in == null) {
                throw new IllegalArgumentException("no file published/" + file);
            }
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            return parse(file, text.lines().toList());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static List<Row> parse(String file, List<String> lines) {
        if (lines.stream().noneMatch(line -> line.matches("# source: \\S.*"))) {
            throw new IllegalArgumentException(file + ": a line \"# source: …\" must say where the values are from");
        }
        List<String> columns = null;
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            String line = lines.get(i);
            if (line.isBlank() || line.startsWith("#")) {
                continue;
            }
            List<String> fields =
                    Arrays.stream(line.split("\\|", -1)).map(String::strip).toList();
            if (columns == null) {
                columns = fields;
                continue;
            }
            String place = file + ":" + (i + 1);
            if (fields.size() != columns.size()) {
                throw new IllegalArgumentException(
                        place + ": must have " + columns.size() + " fields, got " + fields.size());
            }
            Map<String, String> row = new LinkedHashMap<>();
            for (int column = 0; column < columns.size(); column++) {
                row.put(columns.get(column), fields.get(column));
            }
            rows.add(new Row(place, row));
        }
        if (rows.isEmpty()) {
            throw new IllegalArgumentException(file + ": must have one row or more");
        }
        return List.copyOf(rows);
    }
}
