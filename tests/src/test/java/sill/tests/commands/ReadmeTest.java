package sill.tests.commands;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the README shows works. */
class ReadmeTest {
    private static final Path ROOT = Path.of("").toAbsolutePath().getParent();

    @TempDir
    Path folder;

    @Test
    void theWorksheetOfTheTourHolds() throws IOException {
        Matcher sheet = Pattern.compile("```sill\n(.*?)```", Pattern.DOTALL).matcher(readme());
        assertThat(sheet.find()).isTrue();

        Cli.Ran ran = Cli.run("run", Cli.sheet(folder, "tour.sill", sheet.group(1)));

        assertThat(ran.code()).as(ran.out() + ran.err()).isZero();
        assertThat(ran.out()).contains("2 of 2 checks hold").doesNotContain("warning");
    }

    @Test
    void theFirstCommandNamesAWorksheetThatHolds() throws IOException {
        Matcher command = Pattern.compile("engine/sill run (\\S+\\.sill)").matcher(readme());
        assertThat(command.find()).isTrue();

        Cli.Ran ran = Cli.run("run", ROOT.resolve(command.group(1)), "--out", folder);

        assertThat(ran.code()).as(ran.out() + ran.err()).isZero();
    }

    @Test
    void cautionsStandInTheReadme() throws IOException {
        assertThat(readme()).contains("## Cautions", "mains", "local codes", "licensed practitioner");
    }

    private static String readme() throws IOException {
        return Files.readString(ROOT.resolve("README.md"));
    }
}
