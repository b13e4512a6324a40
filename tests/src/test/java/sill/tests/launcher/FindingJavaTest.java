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

/** Which Java a start takes, and what it says of one that does not serve. Each message is compared whole. */
@DisabledOnOs(OS.WINDOWS)
class FindingJavaTest {
    private static final String ANOTHER =
            "install a JDK 17 or newer (on Debian: apt-get install openjdk-17-jdk) and set JAVA_HOME to its folder";

    @TempDir
    Path temp;

    Path jdk;
    House house;

    @BeforeEach
    void makeHouse() throws IOException {
        temp = temp.toRealPath();
        jdk = temp.resolve("jdk");
        house = new House(temp.resolve("house"), temp.resolve("tools")).built();
        house.with("JAVA_HOME", jdk.toString());
    }

    @Test
    void takesTheJdkOfJavaHome() throws IOException {
        FakeJdk.whole(jdk, "17.0.15");
        Outcome outcome = house.start("--version");
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.out()).endsWith("sill.cli.Main\n--version\n");
        assertThat(outcome.code()).isZero();
    }

    @Test
    void takesTheJdkThatTheJavaOnPathLinksTo() throws IOException {
        FakeJdk.whole(jdk, "25.0.3");
        Path alternative = Files.createDirectories(temp.resolve("alternatives")).resolve("java");
        Files.createSymbolicLink(alternative, Path.of("../jdk/bin/java"));
        Files.createSymbolicLink(temp.resolve("tools/java"), alternative);
        house.with("JAVA_HOME", "");
        Outcome outcome = house.start();
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.out()).endsWith("sill.cli.Main\n");
    }

    @Test
    void javaHomeThatLeadsNowhere() throws IOException {
        assertRefused("JAVA_HOME is %s, but there is no bin/java in that folder", """
                JAVA_HOME to be the folder of a JDK 17 or newer""", """
                set JAVA_HOME to such a folder, or unset it to use the java on PATH""");
    }

    @Test
    void noJavaAtAll() throws IOException {
        house.with("JAVA_HOME", "");
        assertRefused("no Java found: JAVA_HOME is not set and there is no java on PATH", "a JDK 17 or newer", """
                install one (on Debian: apt-get install openjdk-17-jdk) and put its bin folder on PATH or set JAVA_HOME""");
    }

    @Test
    void tooOldByJavaHome() throws IOException {
        FakeJdk.whole(jdk, "11.0.22");
        assertRefused("the Java in %s (found by JAVA_HOME) is version 11.0.22", "a JDK 17 or newer", ANOTHER);
    }

    @Test
    void tooOldOnPathWithAVersionOfTheOldKind() throws IOException {
        FakeJdk.whole(jdk, "1.8.0_402");
        Files.createSymbolicLink(temp.resolve("tools/java"), jdk.resolve("bin/java"));
        house.with("JAVA_HOME", "");
        assertRefused("the Java in %s (found by PATH) is version 1.8.0_402", "a JDK 17 or newer", ANOTHER);
    }

    @Test
    void anEarlyAccessVersionCountsByItsFirstNumber() throws IOException {
        FakeJdk.whole(jdk, "27-ea");
        assertThat(house.start().code()).isZero();
    }

    @Test
    void aRuntimeWithoutCompiler() throws IOException {
        FakeJdk.runtime(jdk, "17.0.15");
        assertRefused("""
                the Java 17.0.15 in %s (found by JAVA_HOME) is a runtime without a compiler: it has no bin/javac""", """
                a JDK, which compiles worksheets""", ANOTHER);
    }

    @Test
    void aJdkWithoutTheSnippetModule() throws IOException {
        FakeJdk.withModules(jdk, "17.0.15", "java.base jdk.compiler jdk.jshellx");
        assertRefused(
                "the Java 17.0.15 in %s (found by JAVA_HOME) lacks the module jdk.jshell",
                "a full JDK, which compiles worksheets", ANOTHER);
    }

    @Test
    void aJavaThatDoesNotTellItsVersion() throws IOException {
        FakeJdk.bare(jdk, "echo 'no idea' >&2\n");
        assertRefused("the Java in %s (found by JAVA_HOME) does not tell its version", "a JDK 17 or newer", ANOTHER);
    }

    /** Wrappers that choose a JDK by folder stand on PATH without a release file beside them. */
    @Test
    void aJavaWithoutReleaseFileIsAskedWhereItLies() throws IOException {
        FakeJdk.whole(temp.resolve("real"), "21.0.2");
        FakeJdk.bare(jdk, """
                case $* in
                '-XshowSettings:properties -version')
                    echo "    java.home = %s" >&2
                    echo '    java.version = 21.0.2' >&2
                    ;;
                *) echo "wrapped $*" ;;
                esac
                """.formatted(temp.resolve("real")));
        Outcome outcome = house.start("new", "x.sill");
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.out()).startsWith("wrapped ").endsWith(" sill.cli.Main new x.sill\n");
    }

    @Test
    void aFolderThatJavaCannotStartFrom() throws IOException {
        FakeJdk.whole(jdk, "17.0.15");
        Path root = temp.resolve("12:30");
        House other = new House(root, temp.resolve("tools2")).built().with("JAVA_HOME", jdk.toString());
        assertThat(other.start()).isEqualTo(new Outcome(3, "", """
                sill: Sill lies in %s, and Java cannot start from a folder with a colon in its name
                  expected: a folder without a colon
                  mend: move or clone Sill into another folder
                """.formatted(root)));
    }

    private void assertRefused(String found, String expected, String mend) throws IOException {
        String message = "sill: " + found.formatted(jdk) + "\n  expected: " + expected + "\n  mend: "
                + mend.formatted(jdk) + "\n";
        assertThat(house.start("run", "x.sill")).isEqualTo(new Outcome(3, "", message));
    }
}
