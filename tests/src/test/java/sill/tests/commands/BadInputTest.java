package sill.tests.commands;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What can't be run is said in one message, with the right exit code, and leaves earlier records alone. */
class BadInputTest {
    @TempDir
    Path folder;

    private Path sheet;

    @BeforeEach
    void anEarlierRecord() throws IOException {
        sheet = folder.resolve("a.sill");
        Files.writeString(folder.resolve("a.html"), "earlier page");
        Files.writeString(folder.resolve("a.json"), "earlier data");
    }

    private void assertEarlierRecordStands() throws IOException {
        assertThat(folder.resolve("a.html")).hasContent("earlier page");
        assertThat(folder.resolve("a.json")).hasContent("earlier data");
    }

    private void assertUnusable(Cli.Ran ran, String message, String mend) throws IOException {
        assertThat(ran.err())
                .isEqualTo("sill: " + message + System.lineSeparator() + "  mend: " + mend + System.lineSeparator());
        assertThat(ran.out()).isEmpty();
        assertThat(ran.code()).isEqualTo(3);
        assertEarlierRecordStands();
    }

    @Test
    void missingSheet() throws IOException {
        assertUnusable(
                Cli.run("run", sheet),
                "there is no file " + sheet,
                "check the path; \"sill new " + sheet + "\" makes a worksheet");
    }

    @Test
    void aFolderForASheet() throws IOException {
        assertUnusable(
                Cli.run("run", folder), folder + " is a folder, a worksheet file was expected", "name the file in it");
    }

    @Test
    void notUtf8() throws IOException {
        Files.write(sheet, "sill 1\ntitle: K\u00fchler\n".getBytes(StandardCharsets.ISO_8859_1));

        assertUnusable(
                Cli.run("run", sheet), sheet + " is not UTF-8: line 2 has the byte 0xFC", "save the file as UTF-8");
    }

    @Test
    void theOutputFolderIsAFile() throws IOException {
        Files.writeString(sheet, "sill 1\ntitle: T\n");
        Path file = Files.writeString(folder.resolve("file"), "");

        assertUnusable(
                Cli.run("run", sheet, "--out", file),
                "the folder " + file + " can't be made",
                "choose another with --out");
    }

    @Test
    void theRecordsNameIsTakenByAFolder() throws IOException {
        Path other = Files.writeString(folder.resolve("b.sill"), "sill 1\ntitle: T\n");
        Path taken = Files.createDirectory(folder.resolve("b.json"));

        assertUnusable(
                Cli.run("run", other),
                taken + " is a folder, the record's file would have that name",
                "move it, or choose another folder with --out");
    }

    @Test
    void noSheet() throws IOException {
        assertUnusable(Cli.run("run"), "Missing required parameter: 'SHEET'", "see \"sill run --help\"");
    }

    @Test
    void unknownOption() throws IOException {
        assertUnusable(Cli.run("run", sheet, "--ouch"), "Unknown option: '--ouch'", "see \"sill run --help\"");
    }

    @Test
    void limitsThatAreNone() throws IOException {
        assertUnusable(
                Cli.run("run", sheet, "--time-limit", "soon"),
                "Invalid value for option '--time-limit': found \"soon\", expected a whole number above 0 with ms, s or min, "
                        + "as in 60s",
                "see \"sill run --help\"");
        assertUnusable(
                Cli.run("run", sheet, "--memory", "8m"),
                "Invalid value for option '--memory': found \"8m\", expected at least 64m, with m for MiB or g for GiB, as in "
                        + "512m",
                "see \"sill run --help\"");
    }

    @Test
    void emptyFile() throws IOException {
        Files.writeString(sheet, "");

        Cli.Ran ran = Cli.run("run", sheet, "--out", folder.resolve("new"));

        assertThat(ran.out()).contains("problem at line 1, column 1: ");
        assertThat(ran.code()).isEqualTo(2);
    }

    @Test
    void aLineOf10Megabytes() throws IOException {
        Files.writeString(
                sheet,
                "sill 1\ntitle: T\n:: given G\nv = 5 V | " + "x".repeat(10_000_000) + "\nw = 5 V | ok\n"
                        + ":: calc C\ndouble y = w + 1; // " + "y".repeat(1000) + "\n");

        Cli.Ran ran = Cli.run("run", sheet, "--out", folder.resolve("new"));

        assertThat(ran.err()).isEmpty();
        assertThat(ran.out().length()).isLessThan(100_000);
        assertThat(ran.code()).isIn(0, 2);
    }

    @Test
    void aDataFileThatIsNotThereIsAProblemOfItsLine() throws IOException {
        Files.writeString(
                sheet,
                "sill 1\ntitle: T\n:: given G\nbench = file \"none.csv\"\nv = 5 V\n:: calc C\nint n = bench.rows();\n:: calc D\n"
                        + "double w = v;\n");

        Cli.Ran ran = Cli.run("run", sheet, "--out", folder.resolve("new"));

        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.out()).contains("1 of 2 calculation cells ran").contains("""
                        problem at line 4, column 1: Data file "none.csv" was not found
                          4 | bench = file "none.csv"
                            | ^
                          mend: The path starts from the worksheet's folder.
                        """);
        assertThat(Files.readString(folder.resolve("new/a.json"))).contains("waits on bench (cell 1)");
    }

    @Test
    void aLinkOutOfTheFolderIsNotFollowed() throws IOException {
        Path inside = Files.createDirectory(folder.resolve("sheets"));
        Files.writeString(folder.resolve("secret.csv"), "v\n1\n");
        Files.createSymbolicLink(inside.resolve("data.csv"), folder.resolve("secret.csv"));
        Path linked = Files.writeString(
                inside.resolve("b.sill"), "sill 1\ntitle: T\n:: given G\nbench = file \"data.csv\"\n");

        Cli.Ran ran = Cli.run("run", linked);

        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.out()).contains("Data file \"data.csv\" lies outside the worksheet's folder");
        assertThat(Files.readString(inside.resolve("b.json"))).contains("\"files\": []");
    }

    @Test
    void aFolderForADataFile() throws IOException {
        Files.createDirectory(folder.resolve("bench"));
        Files.writeString(sheet, "sill 1\ntitle: T\n:: given G\nbench = file \"bench\"\n");

        Cli.Ran ran = Cli.run("run", sheet, "--out", folder.resolve("new"));

        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.out()).contains("Data file \"bench\" is no file");
    }

    @Test
    void textFromTheSheetCannotSteerTheTerminal() throws IOException {
        Files.writeString(sheet, "sill 1\ntitle: \u001b[2Jwiped\u202e\n:: calc C\ndouble x = \u001b;\n");

        Cli.Ran ran = Cli.run("run", sheet, "--out", folder.resolve("new"));

        assertThat(ran.out()).doesNotContain("\u001b").doesNotContain("\u202e").contains("<U+001B>[2Jwiped<U+202E>");
    }
}
