package sill.tests.architecture;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import sill.tests.Clone;

/** Where what lies, and how long a file may get. */
class FolderRulesTest {
    private static final int MOST_LINES = 400;

    private static final Path ROOT = Clone.root();

    private static List<Path> mainSources() throws IOException {
        try (Stream<Path> engine = Files.walk(ROOT.resolve("engine/src/main/java"));
                Stream<Path> stdlib = Files.walk(ROOT.resolve("stdlib/src/main/java"))) {
            List<Path> sources = Stream.concat(engine, stdlib)
                    .filter(file -> file.toString().endsWith(".java"))
                    .toList();
            assertThat(sources).hasSizeGreaterThan(150);
            return sources;
        }
    }

    @Test
    void theTopLevelHoldsNothingMore() throws IOException {
        try (Stream<Path> entries = Files.list(ROOT)) {
            List<String> names = entries.map(entry -> entry.getFileName().toString())
                    // Maven's own folder for the parent; git ignores it.
                    .filter(name -> !name.startsWith(".") && !name.equals("target"))
                    .toList();
            assertThat(names)
                    .containsExactlyInAnyOrder(
                            "README.md", "DEVELOPERS.md", "pom.xml", "engine", "stdlib", "worksheets", "tests");
        }
    }

    @Test
    void everyPackageHasItsDoorSign() throws IOException {
        assertThat(mainSources().stream().map(Path::getParent).distinct())
                .allSatisfy(folder ->
                        assertThat(folder.resolve("package-info.java")).exists());
    }

    @Test
    void noFileIsLongerThanOneReads() throws IOException {
        assertThat(mainSources())
                .allSatisfy(file -> assertThat(Files.readAllLines(file))
                        .as("lines of %s", ROOT.relativize(file))
                        .hasSizeLessThanOrEqualTo(MOST_LINES));
    }
}
