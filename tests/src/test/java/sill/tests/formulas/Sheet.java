package sill.tests.formulas;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.jsoup.Jsoup;
import sill.cli.Main;

/**
 * A worksheet, run: its record as JSON, and the lines of its page.
 *
 * @param said what the command printed, for a test that fails
 */
record Sheet(JsonNode record, List<PageLine> lines, String said) {
    static Sheet run(Path sheet, Path folder) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        PrintStream stream = new PrintStream(out, true, StandardCharsets.UTF_8);
        try {
            Main.run(stream, stream, "run", sheet.toString(), "--out", folder.toString());
            String name = sheet.getFileName().toString().replaceFirst("\\.sill$", "");
            return new Sheet(
                    new ObjectMapper().readTree(folder.resolve(name + ".json").toFile()),
                    PageLine.of(Jsoup.parse(Files.readString(folder.resolve(name + ".html")))),
                    out.toString(StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UncheckedIOException(out.toString(StandardCharsets.UTF_8), e);
        }
    }

    /** The JSON value at an address. */
    JsonNode value(String at) {
        for (JsonNode value : record.get("values")) {
            if (value.get("at").asText().equals(at)) {
                return value;
            }
        }
        throw new AssertionError("the record has no value at " + at + ": " + said);
    }
}
