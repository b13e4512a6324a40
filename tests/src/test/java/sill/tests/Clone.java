package sill.tests;

import java.nio.file.Files;
import java.nio.file.Path;

/** The clone that these tests belong to. */
public final class Clone {
    private Clone() {}

    /** Its top folder, whether Maven runs in it or in a module of it. */
    public static Path root() {
        Path folder = Path.of("").toAbsolutePath();
        while (!Files.exists(folder.resolve("engine/sill"))) {
            folder = folder.getParent();
        }
        return folder;
    }
}
