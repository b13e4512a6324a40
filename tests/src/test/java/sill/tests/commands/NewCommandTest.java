package sill.tests.commands;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class NewCommandTest {
    @TempDir
    Path folder;

    @Test
    void theNewSheetRunsAndHolds() {
        Path file = folder.resolve("pump.sill");

        Cli.Ran made = Cli.run("new", file);
        Cli.Ran ran = Cli.run("run", file);

        assertThat(made.code()).isZero();
        assertThat(made.out()).isEqualTo("wrote " + file + "; run it with: sill run " + file + System.lineSeparator());
        assertThat(ran.code()).isZero();
        assertThat(ran.out()).contains("holds: 3 of 3 checks hold");
    }

    @Test
    void aFileThatExistsIsLeftAlone() throws IOException {
        Path file = Files.writeString(folder.resolve("mine.sill"), "mine");

        Cli.Ran made = Cli.run("new", file);

        assertThat(made.code()).isEqualTo(3);
        assertThat(made.err())
                .isEqualTo("sill: " + file + " exists already" + System.lineSeparator() + "  mend: choose another name"
                        + System.lineSeparator());
        assertThat(file).hasContent("mine");
    }

    @Test
    void theFolderMustBeThere() {
        Path file = folder.resolve("none").resolve("a.sill");

        Cli.Ran made = Cli.run("new", file);

        assertThat(made.code()).isEqualTo(3);
        assertThat(made.err()).startsWith("sill: there is no folder " + folder.resolve("none"));
    }
}
