package sill.tests.browser;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import sill.cli.Main;

/** Records as {@code sill run} leaves them. */
final class RecordFile {
    private RecordFile() {}

    /** The page of a worksheet whose checks hold, written into a folder. */
    static Path of(String worksheet, Path folder) throws IOException {
        Path sheet = Files.writeString(folder.resolve("sheet.sill"), worksheet);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        PrintStream stream = new PrintStream(out, true, StandardCharsets.UTF_8);
        assertThat(Main.run(stream, stream, "run", sheet.toString()))
                .as(out.toString(StandardCharsets.UTF_8))
                .isZero();
        return folder.resolve("sheet.html");
    }
}
