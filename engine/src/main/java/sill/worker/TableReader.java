package sill.worker;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import sill.stdlib.Table;
import sill.units.Unit;
import sill.units.UnitException;
import sill.words.Quoted;

/**
 * Reads a data file as a table: comma separated (RFC 4180) in UTF-8, a header line first. A header such as {@code vIn [mV]}
 * names the unit its numbers are in. A column is text as soon as one of its fields is neither a number nor empty.
 */
final class TableReader {
    private static final String OPEN_QUOTE = "found a quoted field without its closing quote";

    private TableReader() {}

    /** A file that is no table; the message names the line. */
    static final class NoTable extends Exception {
        private static final long serialVersionUID = 1;

        NoTable(String message) {
            super(message);
        }
    }

    /**
     * A table as read.
     *
     * @param units coherent unit symbols of the columns whose header names a unit
     */
    record Read(Table table, Map<String, String> units) {}

    static Read read(byte[] bytes) throws NoTable {
        quotesArePaired(bytes);
        List<List<String>> rows = new ArrayList<>();
        List<Long> lines = new ArrayList<>();
        // A decoder that reports, since a wrong character would be a wrong number.
        Reader text = new InputStreamReader(
                new ByteArrayInputStream(withoutMark(bytes)),
                StandardCharsets.UTF_8
                        .newDecoder()
                        .onMalformedInput(CodingErrorAction.REPORT)
                        .onUnmappableCharacter(CodingErrorAction.REPORT));
        try (CsvReader<CsvRecord> csv = CsvReader.builder()
                .allowMissingFields(true)
                .allowExtraFields(true)
                .ofCsvRecord(text)) {
            for (CsvRecord row : csv) {
                rows.add(row.getFields());
                lines.add(row.getStartingLineNumber());
            }
        } catch (CsvParseException | UncheckedIOException | IOException e) {
            throw new NoTable(isAboutCharacters(e) ? "found bytes that are not UTF-8 text" : OPEN_QUOTE);
        }
        if (rows.isEmpty()) {
            throw new NoTable("found nothing, expected a header line");
        }
        return table(rows, lines);
    }

    private static boolean isAboutCharacters(Throwable thrown) {
        return thrown != null && (thrown instanceof CharacterCodingException || isAboutCharacters(thrown.getCause()));
    }

    /** The reader takes all that follows an open quote for one field: a table would quietly be short. */
    private static void quotesArePaired(byte[] bytes) throws NoTable {
        boolean open = false;
        for (byte b : bytes) {
            open ^= b == '"';
        }
        if (open) {
            throw new NoTable(OPEN_QUOTE);
        }
    }

    private static byte[] withoutMark(byte[] bytes) {
        boolean marked =
                bytes.length >= 3 && bytes[0] == (byte) 0xEF && bytes[1] == (byte) 0xBB && bytes[2] == (byte) 0xBF;
        return marked ? java.util.Arrays.copyOfRange(bytes, 3, bytes.length) : bytes;
    }

    private static Read table(List<List<String>> rows, List<Long> lines) throws NoTable {
        List<String> header = rows.get(0);
        otherSeparator(header);
        for (int row = 1; row < rows.size(); row++) {
            int found = rows.get(row).size();
            if (found != header.size()) {
                throw new NoTable("line " + lines.get(row) + ": found " + found + (found == 1 ? " field" : " fields")
                        + ", expected " + header.size() + " as in the header");
            }
        }
        Map<String, Object> columns = new LinkedHashMap<>();
        Map<String, String> units = new LinkedHashMap<>();
        for (int i = 0; i < header.size(); i++) {
            int column = i;
            List<String> fields =
                    rows.stream().skip(1).map(row -> row.get(column).strip()).toList();
            String title = header.get(i).strip();
            int bracket = title.endsWith("]") ? title.lastIndexOf('[') : -1;
            String name = bracket < 0 ? title : title.substring(0, bracket).strip();
            if (name.isEmpty()) {
                throw new NoTable("line 1: found no name for column " + (i + 1));
            }
            Unit unit = bracket < 0 ? Unit.ONE : unit(title.substring(bracket + 1, title.length() - 1));
            if (bracket >= 0) {
                units.put(name, unit.coherent().symbol());
            }
            if (columns.put(name, values(fields, unit)) != null) {
                throw new NoTable("line 1: found the column " + Quoted.of(name) + " twice, expected each name once");
            }
        }
        return new Read(new Table(columns), units);
    }

    /** One column whose name holds what other programs put between fields is more likely several. */
    private static void otherSeparator(List<String> header) throws NoTable {
        String only = header.size() == 1 ? header.get(0) : "";
        if (only.contains(";")) {
            throw new NoTable("found semicolons, expected commas between the fields");
        } else if (only.contains("\t")) {
            throw new NoTable("found tabs, expected commas between the fields");
        }
    }

    private static Unit unit(String symbol) throws NoTable {
        try {
            return Unit.parse(symbol.strip());
        } catch (UnitException e) {
            throw new NoTable("line 1: " + e.getMessage().substring(0, 1).toLowerCase(Locale.ROOT)
                    + e.getMessage().substring(1));
        }
    }

    private static Object values(List<String> fields, Unit unit) {
        double[] numbers = new double[fields.size()];
        for (int i = 0; i < numbers.length; i++) {
            String field = fields.get(i);
            try {
                numbers[i] = field.isEmpty() ? Double.NaN : unit.toSi(number(field));
            } catch (NumberFormatException e) {
                return fields;
            }
        }
        return numbers;
    }

    /** Java's own reading of a number also takes {@code 1d} and {@code 0x1p3}, which no instrument writes. */
    private static double number(String field) {
        if (!field.matches("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?")) {
            throw new NumberFormatException(field);
        }
        return Double.parseDouble(field);
    }
}
