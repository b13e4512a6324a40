package sill.tests.launcher;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** From wherever and by whatever path Sill is started, its arguments, input, output and exit code stay as they are. */
@DisabledOnOs(OS.WINDOWS)
class PassingThroughTest {
    @TempDir
    Path temp;

    Path jdk;
    House house;

    @BeforeEach
    void makeHouse() throws IOException {
        temp = temp.toRealPath();
        jdk = FakeJdk.whole(temp.resolve("java 17"), "17.0.15");
        house = new House(temp.resolve("my $HOME, 'old' \"house\" *"), temp.resolve("tools"))
                .built()
                .with("JAVA_HOME", jdk.toString());
    }

    private void assertStarts(Path folder, Path script) throws IOException {
        Outcome outcome = House.await(house.begin(folder, script, "--version"));
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.out()).contains("-cp\n" + house.jar() + ":").endsWith("\nsill.cli.Main\n--version\n");
    }

    @Test
    void fromAnotherFolderByTheWholePath() throws IOException {
        assertStarts(temp, house.script());
    }

    @Test
    void fromTheHouse() throws IOException {
        assertStarts(house.root(), Path.of("engine/sill"));
        assertStarts(house.root().resolve("engine"), Path.of("./sill"));
        assertStarts(house.root().resolve("stdlib"), Path.of("../engine/sill"));
    }

    @Test
    void fromPath() throws IOException {
        house.with("PATH", temp.resolve("tools") + ":" + house.script().getParent());
        assertStarts(temp, temp.resolve("tools/sh"), "-c", "sill --version");
    }

    private void assertStarts(Path folder, Path program, String... arguments) throws IOException {
        Outcome outcome = House.await(house.begin(folder, program, arguments));
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.out()).endsWith("\nsill.cli.Main\n--version\n");
    }

    @Test
    void throughALink() throws IOException {
        Path link = Files.createDirectories(temp.resolve("my links")).resolve("sill");
        Files.createSymbolicLink(link, house.script());
        assertStarts(temp, link);
    }

    @Test
    void throughARelativeLinkToALinkInALinkedFolder() throws IOException {
        Path links = Files.createDirectories(temp.resolve("links"));
        Files.createSymbolicLink(temp.resolve("linked house"), house.root());
        Files.createSymbolicLink(links.resolve("inner"), Path.of("../linked house/engine/sill"));
        Files.createSymbolicLink(links.resolve("outer"), Path.of("inner"));
        assertStarts(links, Path.of("./outer"));
    }

    @Test
    void aFolderOfCdpathIsNotEntered() throws IOException {
        House.write(temp.resolve("elsewhere/engine/pom.xml"), "");
        house.with("CDPATH", temp.resolve("elsewhere").toString());
        assertStarts(house.root(), Path.of("engine/sill"));
    }

    @Test
    void argumentsStayAsTheyAre() throws IOException {
        String[] arguments = {
            "run", "my sheet.sill", "", "*", "$HOME", "it's", "say \"so\"", "a\\b", "-Dx=1", "Tür.sill"
        };
        Outcome outcome = house.start(arguments);
        assertThat(outcome.out()).endsWith("sill.cli.Main\n" + String.join("\n", arguments) + "\n");
    }

    @Test
    void inputOutputAndExitCodePass() throws IOException {
        FakeJdk.bare(jdk, "cat\necho told >&2\nexit 7\n");
        House.write(temp.resolve("input"), "typed\n");
        Outcome outcome = House.await(house.begin(
                temp,
                temp.resolve("tools/sh"),
                "-c",
                "exec '" + house.script().toString().replace("'", "'\\''") + "' <input"));
        assertThat(outcome).isEqualTo(new Outcome(7, "typed\n", "told\n"));
    }

    /** Without a locale a Java reads file names as ASCII; with one of UTF-8 it does not. */
    @Test
    void aMissingLocaleBecomesUtf8AndASetOneStays() throws IOException {
        FakeJdk.bare(jdk, "echo \"$LC_ALL\"\n");
        assertThat(house.with("LC_ALL", "").start().out()).isEqualTo("C.UTF-8\n");
        assertThat(house.with("LC_ALL", "POSIX").start().out()).isEqualTo("C.UTF-8\n");
        assertThat(house.with("LC_ALL", "de_DE.UTF-8").start().out()).isEqualTo("de_DE.UTF-8\n");
    }

    @Test
    void theOptionsOfTheJvm() throws IOException {
        assertThat(house.start("new").out()).isEqualTo("""
                -XX:+UseSerialGC
                -XX:TieredStopAtLevel=1
                -XX:+UseTransparentHugePages
                -Xmx384m
                -Xshare:auto
                -Xlog:disable
                -Dfile.encoding=UTF-8
                -Djava.awt.headless=true
                -cp
                %s
                sill.cli.Main
                new
                """.formatted(house.jar() + ":" + house.library()));
    }
}
