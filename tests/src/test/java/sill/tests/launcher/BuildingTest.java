package sill.tests.launcher;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** When a start builds Sill and what it says then. Maven is a script that notes its arguments and leaves a jar. */
@DisabledOnOs(OS.WINDOWS)
class BuildingTest {
    private static final String FIRST_USE = "sill: first use; building with Maven, which may take a minute\n";
    private static final String CHANGED = "sill: the sources have changed; building with Maven\n";

    @TempDir
    Path temp;

    Path mavenCalls;
    House house;

    @BeforeEach
    void makeHouse() throws IOException {
        temp = temp.toRealPath();
        mavenCalls = temp.resolve("maven-calls");
        Path jdk = FakeJdk.whole(temp.resolve("jdk"), "17.0.15");
        house = new House(temp.resolve("house"), temp.resolve("tools")).with("JAVA_HOME", jdk.toString());
        maven("mkdir -p engine/target/lib\n: >engine/target/sill.jar\n");
    }

    private void maven(String leaving) throws IOException {
        house.tool("mvn", "echo \"$JAVA_HOME: $*\" >>'" + mavenCalls + "'\n" + leaving);
    }

    private List<String> mavenCalls() throws IOException {
        return Files.exists(mavenCalls) ? Files.readAllLines(mavenCalls) : List.of();
    }

    /** Makes all sources older than the jar, as a checkout is that was built a while ago. */
    private void builtLongAgo() throws IOException {
        house.built();
        age(house.root(), Instant.parse("2026-01-01T00:00:00Z"));
        Files.setLastModifiedTime(house.jar(), FileTime.from(Instant.parse("2026-01-02T00:00:00Z")));
    }

    private static void age(Path folder, Instant time) throws IOException {
        try (var files = Files.walk(folder)) {
            for (Path file : files.toList()) {
                Files.setLastModifiedTime(file, FileTime.from(time));
            }
        }
    }

    @Test
    void firstUseBuildsWithTheSameJavaAndSaysSoInOneLine() throws IOException {
        Outcome outcome = house.start("--help");
        assertThat(outcome.err()).isEqualTo(FIRST_USE);
        assertThat(outcome.out()).endsWith("sill.cli.Main\n--help\n");
        assertThat(mavenCalls())
                .containsExactly(temp.resolve("jdk")
                        + ": -q -B -Dstyle.color=never -pl engine -am package -DskipTests -Dspotless.check.skip=true");
    }

    @Test
    void theNextStartBuildsNothing() throws IOException {
        house.start();
        assertThat(house.start().err()).isEmpty();
        assertThat(mavenCalls()).hasSize(1);
    }

    @Test
    void aBuildOfAWhileAgoServes() throws IOException {
        builtLongAgo();
        assertThat(house.start().err()).isEmpty();
        assertThat(mavenCalls()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "engine/src/main/java/Source.java",
                "stdlib/src/main/java/Source.java",
                "engine/pom.xml",
                "stdlib/pom.xml",
                "pom.xml"
            })
    void aChangedSourceBuildsOnce(String source) throws IOException {
        builtLongAgo();
        House.write(house.root().resolve(source), "changed");
        assertThat(house.start().err()).isEqualTo(CHANGED);
        assertThat(house.start().err()).isEmpty();
        assertThat(mavenCalls()).hasSize(1);
    }

    @Test
    void aRemovedSourceBuilds() throws IOException {
        builtLongAgo();
        Files.delete(house.root().resolve("engine/src/main/java/Source.java"));
        assertThat(house.start().err()).isEqualTo(CHANGED);
    }

    /** Maven may leave a jar as it is; and what is saved while it runs must not be lost. */
    @Test
    void aSourceSavedDuringTheBuildBuildsAgain() throws IOException {
        builtLongAgo();
        House.write(house.root().resolve("pom.xml"), "changed");
        maven("sleep 0.02\ntouch engine/src/main/java/Source.java\n");
        assertThat(house.start().err()).isEqualTo(CHANGED);
        maven("mkdir engine/target/lib\n");
        assertThat(house.start().err()).isEqualTo(CHANGED);
        assertThat(house.start().err()).isEmpty();
        assertThat(mavenCalls()).hasSize(2);
    }

    @Test
    void librariesOfAnEarlierBuildGo() throws IOException {
        builtLongAgo();
        House.write(house.root().resolve("engine/pom.xml"), "changed");
        maven("mkdir engine/target/lib\n: >engine/target/lib/library-1.1.jar\n");
        assertThat(house.start().out())
                .contains("sill.jar:" + house.target().resolve("lib/library-1.1.jar") + "\n")
                .doesNotContain(house.library().toString());
    }

    @Test
    void withoutMaven() throws IOException {
        Files.delete(temp.resolve("tools/mvn"));
        assertThat(house.start("run", "x.sill")).isEqualTo(new Outcome(3, "", """
                sill: Sill must be built first, and there is no mvn on PATH
                  expected: Apache Maven 3.8 or newer
                  mend: install it (on Debian: apt-get install maven) and start again
                """));
    }

    @Test
    void mavenIsNotNeededOnceBuilt() throws IOException {
        Files.delete(temp.resolve("tools/mvn"));
        house.built();
        assertThat(house.start().err()).isEmpty();
    }

    @Test
    void aFailedBuildShowsWhatMavenSaid() throws IOException {
        maven("echo '[ERROR] Source.java:[1,7] not a statement'\nexit 1\n");
        assertThat(house.start("run", "x.sill")).isEqualTo(new Outcome(3, "", FIRST_USE + """
                [ERROR] Source.java:[1,7] not a statement
                sill: the build failed; what Maven said stands above
                  expected: the sources to compile
                  mend: mend what Maven names, then start again (the build alone: mvn -B -pl engine -am package in %s)
                """.formatted(house.root())));
        assertThat(house.target().resolve("building")).doesNotExist();
    }

    @Test
    void aTargetThatCannotBeWritten() throws IOException {
        Files.delete(house.target().resolve("cds"));
        Files.delete(house.target());
        House.write(house.target(), "a file in the folder's place");
        assertThat(house.start("run", "x.sill")).isEqualTo(new Outcome(3, "", """
                sill: Sill must be built first, and %s cannot be written
                  expected: a folder that the build can write
                  mend: give yourself the right to write there, or clone Sill into a folder of yours
                """.formatted(house.target())));
    }

    /** Maven ends only when the second start has said that it waits. */
    @Test
    void twoFirstStartsBuildOnce() throws IOException {
        Path waits = temp.resolve("waits");
        house.tool("sleep", ": >'" + waits + "'\n");
        maven("until [ -f '" + waits + "' ]; do :; done\nmkdir engine/target/lib\n: >engine/target/sill.jar\n");
        House.Started one = house.begin(temp, house.script(), "one");
        House.Started two = house.begin(temp, house.script(), "two");
        Outcome first = House.await(one);
        Outcome second = House.await(two);
        assertThat(first.out()).endsWith("sill.cli.Main\none\n");
        assertThat(second.out()).endsWith("sill.cli.Main\ntwo\n");
        assertThat(List.of(first.err(), second.err()))
                .containsExactlyInAnyOrder(FIRST_USE, "sill: waiting for another start of Sill that is building it\n");
        assertThat(mavenCalls()).hasSize(1);
    }

    @Test
    void aBuildWhoseProcessDiedIsTakenOver() throws Exception {
        Process dead = new ProcessBuilder("true").start();
        dead.waitFor();
        House.write(house.target().resolve("building/holder"), dead.pid() + "\n");
        Outcome outcome = house.tool("sleep", "").start();
        assertThat(outcome.err()).endsWith(FIRST_USE);
        assertThat(outcome.code()).isZero();
        assertThat(house.target().resolve("building")).doesNotExist();
    }

    /** This test's own process holds the build and never ends it; {@code sleep} takes no time here. */
    @Test
    void aBuildThatNeverEndsIsNotWaitedForEver() throws IOException {
        long living = ProcessHandle.current().pid();
        House.write(house.target().resolve("building/holder"), living + "\n");
        Path lock = house.target().resolve("building");
        assertThat(house.tool("sleep", "").start()).isEqualTo(new Outcome(3, "", """
                sill: waiting for another start of Sill that is building it
                sill: another start of Sill has been building it for 10 minutes (it holds %1$s)
                  expected: a build to end by then
                  mend: end that start, or delete %1$s if there is none, and start again
                """.formatted(lock)));
    }
}
