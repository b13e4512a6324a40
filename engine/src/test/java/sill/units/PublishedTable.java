package sill.units;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** A data file of published values: tab-separated, the last column being the source, which every row must have. */
public final class PublishedTable {
    private PublishedTable() {}

    /** The rows of a file under {@code published/}; fails when there is none, or one without a source. */
    public static List<String[]> rows(String file, int columns) {
        try (InputStream in = PublishedTable.class.getResourceAsStream("/published/" + file)) {
            List<String[]> rows = new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .map(line -> line.split("\t", -1))
                    .toList();
            if (rows.isEmpty()) {
                throw new AssertionError(file + " has no rows");
            }
            for (String[] row : rows) {
                if (row.length != columns || row[columns - 1].isBlank()) {
                    throw new AssertionError(
                            file + ": not " + columns + " columns with a source: " + String.join("\t", row));
                }
            }
            return rows;
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }
}
