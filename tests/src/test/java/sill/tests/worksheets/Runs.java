package sill.tests.worksheets;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.Map;
import sill.cli.Main;

/** Runs each design once, into a folder of its own, and keeps what came of it. */
final class Runs {
    private final Path folder;
    private final Map<Design, Run> done = new EnumMap<>(Design.class);

    Runs(Path folder) {
        this.folder = folder;
    }

    /** What a run left: its exit code, what it printed, the page, and the record as JSON. */
    record Run(int code, String out, String err, String page, JsonNode record) {}

    Run of(Design design) {
        return done.computeIfAbsent(design, this::run);
    }

    private Run run(Design design) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        try {
            Path records = Files.createDirectory(folder.resolve(design.toString()));
            int code = Main.run(
                    new PrintStream(out, true, StandardCharsets.UTF_8),
                    new PrintStream(err, true, StandardCharsets.UTF_8),
                    "run",
                    design.sheet().toString(),
                    "--out",
                    records.toString());
            return new Run(
                    code,
                    out.toString(StandardCharsets.UTF_8),
                    err.toString(StandardCharsets.UTF_8),
                    Files.readString(records.resolve(design + ".html")),
                    new ObjectMapper()
                            .readTree(records.resolve(design + ".json").toFile()));
        } catch (IOException e) {
            throw new UncheckedIOException(design + ": " + out + err, e);
        }
    }
}
