package sill.tests.launcher;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/**
 * Class-data-sharing archives, made and used by the Java that runs this test. The program started is a small one of the
 * test's own, so that nothing here rests on what Sill does.
 */
@DisabledOnOs(OS.WINDOWS)
class ArchivesTest {
    private static final String MAIN = """
            package sill.cli;

            import java.nio.file.Files;
            import java.nio.file.Path;

            public class Main {
                public static void main(String[] args) throws Exception {
                    String training = System.getProperty("sill.cds.train");
                    if (training != null) {
                        Files.writeString(Path.of(training, "worker.jsa"), Files.readString(Path.of(args[1])));
                        Files.writeString(Path.of(args[3], "training.html"), "a record");
                    } else {
                        System.out.println("archives in " + System.getProperty("sill.cds"));
                    }
                }
            }
            """;

    @TempDir
    Path temp;

    House house;
    Path archives;

    @BeforeEach
    void makeHouse() throws IOException {
        temp = temp.toRealPath();
        house = new House(temp.resolve("house"), temp.resolve("tools"))
                .built()
                .with("JAVA_HOME", System.getProperty("java.home"));
        House.write(house.script().resolveSibling("training.sill"), "a sheet");
        writeJar(house.jar());
        writeJar(house.library());
        archives = house.target().resolve("cds").resolve(System.getProperty("java.runtime.version"));
    }

    private void writeJar(Path jar) throws IOException {
        Path source = temp.resolve("Main.java");
        House.write(source, MAIN);
        assertThat(ToolProvider.getSystemJavaCompiler().run(null, null, null, "-d", temp.toString(), source.toString()))
                .isZero();
        try (OutputStream file = Files.newOutputStream(jar);
                JarOutputStream out = new JarOutputStream(file)) {
            out.putNextEntry(new JarEntry("sill/cli/Main.class"));
            out.write(Files.readAllBytes(temp.resolve("sill/cli/Main.class")));
        }
    }

    /** What a start does beside a run, here alone, so that it has ended when this returns. */
    private Outcome makeArchives() throws IOException {
        Outcome outcome = house.with("SILL_TASK", "archives").start();
        house.with("SILL_TASK", "");
        return outcome;
    }

    @Test
    void theFolderCannotBeWritten() throws IOException {
        assertThat(house.start("run")).isEqualTo(new Outcome(0, "archives in null\n", ""));
        assertThat(makeArchives()).isEqualTo(new Outcome(0, "", ""));
    }

    /**
     * The JVM's own log of class loading tells where the program's class came from. (From a path with a space Java 17
     * takes only the JDK's classes from the archive; all else is the same.)
     */
    @Test
    void archivesOfBothProcessesAreMadeInSilenceAndUsed() throws IOException {
        house.withArchives();
        assertThat(makeArchives()).isEqualTo(new Outcome(0, "", ""));
        assertThat(archives.resolve("worker.jsa")).hasContent("a sheet");
        assertThat(archives.resolve("training.html")).doesNotExist();
        assertThat(archives.resolveSibling(archives.getFileName() + ".making")).doesNotExist();
        Path log = temp.resolve("classes.log");
        house.with("_JAVA_OPTIONS", "-Xlog:class+load:file=" + log);
        assertThat(house.start("run").out()).isEqualTo("archives in " + archives + "\n");
        assertThat(Files.readString(log)).contains("sill.cli.Main source: shared objects file (top)");
    }

    @Test
    void aStartWithoutArchivesHasThemMadeBesideIt() throws IOException, InterruptedException {
        house.withArchives();
        assertThat(house.start("run")).isEqualTo(new Outcome(0, "archives in null\n", ""));
        while (!Files.exists(archives.resolve("made")) || Files.exists(archives.resolve("holder"))) {
            Thread.sleep(20);
        }
        assertThat(house.start("run")).isEqualTo(new Outcome(0, "archives in " + archives + "\n", ""));
    }

    @Test
    void aDamagedArchiveIsPassedOverInSilenceUntilTheNextBuild() throws IOException {
        house.withArchives();
        House.write(
                archives.resolve("made"),
                System.getProperty("java.home") + " " + house.script().getParent() + "\n");
        House.write(archives.resolve("parent.jsa"), "not an archive");
        House.write(archives.resolve("worker.jsa"), "of this jar");
        assertThat(house.start("run")).isEqualTo(new Outcome(0, "archives in " + archives + "\n", ""));
        makeArchives();
        assertThat(archives.resolve("worker.jsa")).hasContent("of this jar");

        Files.setLastModifiedTime(house.jar(), FileTime.from(Instant.now().plusSeconds(10)));
        makeArchives();
        assertThat(archives.resolve("worker.jsa")).hasContent("a sheet");
    }

    /** A training run that goes wrong is not repeated at every start. */
    @Test
    void oneTryIsEnough() throws IOException {
        house.withArchives();
        Files.writeString(house.jar(), "not a jar");
        Files.writeString(house.library(), "not a jar");
        makeArchives();
        assertThat(archives.resolve("made")).exists();
        assertThat(archives.resolve("worker.jsa")).doesNotExist();
        writeJar(house.library());
        assertThat(house.start("run")).isEqualTo(new Outcome(0, "archives in null\n", ""));
    }
}
