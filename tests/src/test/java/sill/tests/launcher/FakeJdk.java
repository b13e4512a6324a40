package sill.tests.launcher;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Folders that look like a Java to the start script. Their {@code java} prints its arguments, one a line. */
final class FakeJdk {
    private static final String PRINT_ARGUMENTS = "printf '%s\\n' \"$@\"\n";

    private FakeJdk() {}

    /** A whole JDK of that version. */
    static Path whole(Path home, String version) throws IOException {
        House.program(home.resolve("bin/java"), PRINT_ARGUMENTS);
        House.program(home.resolve("bin/javac"), "");
        return release(home, version, "java.base jdk.compiler jdk.jshell jdk.zipfs");
    }

    /** A runtime of that version: no compiler beside {@code java}. */
    static Path runtime(Path home, String version) throws IOException {
        whole(home, version);
        Files.delete(home.resolve("bin/javac"));
        return home;
    }

    /** A JDK whose image was made with fewer modules. */
    static Path withModules(Path home, String version, String modules) throws IOException {
        whole(home, version);
        return release(home, version, modules);
    }

    /** A {@code java} with nothing beside it, doing what the script says. */
    static Path bare(Path home, String script) throws IOException {
        House.program(home.resolve("bin/java"), script);
        return home;
    }

    private static Path release(Path home, String version, String modules) {
        House.write(home.resolve("release"), """
                IMPLEMENTOR="Nobody"
                JAVA_RUNTIME_VERSION="%1$s+1"
                JAVA_VERSION="%1$s"
                MODULES="%2$s"
                """.formatted(version, modules));
        return home;
    }
}
