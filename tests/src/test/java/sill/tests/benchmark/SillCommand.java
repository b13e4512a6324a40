package sill.tests.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import sill.tests.Clone;

/** The command {@code sill run} as a contender. */
final class SillCommand {
    private static final Path SCRIPT = Clone.root().resolve("engine/sill");

    private final Path folder;
    private final Path javaHome;
    private final Path noInput;

    /** @param folder where worksheets and records go */
    SillCommand(Path folder, Path javaHome) throws IOException {
        this.folder = folder;
        this.javaHome = javaHome;
        noInput = Files.writeString(folder.resolve("none"), "");
    }

    /** A run of a worksheet with this text. */
    Contender run(String name, String file, String text) throws IOException {
        Path sheet = Files.writeString(folder.resolve(file), text);
        return new Contender(
                name,
                List.of(SCRIPT.toString(), "run", sheet.toString(), "--out", folder.toString()),
                noInput,
                javaHome);
    }

    /** Makes the class-data-sharing archives, which are there after a user's first run. */
    void makeArchives() throws IOException, InterruptedException {
        ProcessBuilder builder = new ProcessBuilder(SCRIPT.toString());
        builder.environment().put("SILL_TASK", "archives");
        builder.environment().put("JAVA_HOME", javaHome.toString());
        builder.inheritIO().start().waitFor();
    }
}
