package sill.tests.launcher;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import sill.tests.Clone;

/**
 * A clone in small: the start script, sources to be newer than the jar, and a folder of tools that is all of PATH. Started
 * processes see no environment but PATH, a UTF-8 locale and what {@link #with} adds. A file stands where the folder of
 * archives belongs: a start must go well without one, and then no process goes on after it.
 */
final class House {
    /** The tools that the script and the stand-ins call; a machine with nothing but these can start Sill. */
    private static final List<String> TOOLS =
            List.of("cat", "find", "mkdir", "mv", "nice", "readlink", "rm", "rmdir", "sh", "sleep", "touch");

    private final Path root;
    private final Path tools;
    private final Map<String, String> environment = new HashMap<>();

    /** Makes a house in a new folder. */
    House(Path root, Path tools) throws IOException {
        this.root = root;
        this.tools = Files.createDirectories(tools);
        for (String module : List.of("engine", "stdlib")) {
            write(root.resolve(module).resolve("src/main/java/Source.java"), "class Source {}\n");
            write(root.resolve(module).resolve("pom.xml"), "<project/>\n");
        }
        write(root.resolve("pom.xml"), "<project/>\n");
        Files.copy(Clone.root().resolve("engine/sill"), script());
        executable(script());
        for (String tool : TOOLS) {
            Files.createSymbolicLink(tools.resolve(tool), onPath(tool));
        }
        write(target().resolve("cds"), "in the place of the archives' folder\n");
        environment.put("PATH", tools.toString());
        environment.put("LC_ALL", "C.UTF-8");
    }

    Path root() {
        return root;
    }

    Path script() {
        return root.resolve("engine/sill");
    }

    Path target() {
        return root.resolve("engine/target");
    }

    Path jar() {
        return target().resolve("sill.jar");
    }

    /** Adds to the environment, or replaces. */
    House with(String name, String value) {
        environment.put(name, value);
        return this;
    }

    /** Puts a shell script on PATH, in place of the tool of that name if there is one. */
    House tool(String name, String script) throws IOException {
        Files.deleteIfExists(tools.resolve(name));
        program(tools.resolve(name), script);
        return this;
    }

    /** Leaves the jar and a library as a build does, without content. */
    House built() {
        write(jar(), "");
        write(library(), "");
        return this;
    }

    Path library() {
        return target().resolve("lib/library-1.0.jar");
    }

    /** Lets starts keep class-data-sharing archives, which they do beside the run and so perhaps after its end. */
    House withArchives() throws IOException {
        Files.delete(target().resolve("cds"));
        return this;
    }

    /** Runs {@code engine/sill} from the system's root folder and waits for its end. */
    Outcome start(String... arguments) throws IOException {
        return await(begin(root.getRoot(), script(), arguments));
    }

    /** Begins a start by the given path of the script, in the given folder. */
    Started begin(Path folder, Path script, String... arguments) throws IOException {
        Path out = Files.createTempFile(root, "out", "");
        Path err = Files.createTempFile(root, "err", "");
        ProcessBuilder builder =
                new ProcessBuilder(Stream.concat(Stream.of(script.toString()), Arrays.stream(arguments))
                        .toList());
        builder.directory(folder.toFile()).redirectOutput(out.toFile()).redirectError(err.toFile());
        builder.environment().clear();
        builder.environment().putAll(environment);
        return new Started(builder.start(), out, err);
    }

    /** Waits for the end of a start. */
    static Outcome await(Started started) throws IOException {
        try {
            int code = started.process().waitFor();
            return new Outcome(code, Files.readString(started.out()), Files.readString(started.err()));
        } catch (InterruptedException e) {
            throw new IllegalStateException("interrupted while Sill ran", e);
        }
    }

    /** A start that may still run, and the files that its output goes to. */
    record Started(Process process, Path out, Path err) {}

    /** Writes a file and the folders it lies in. */
    static void write(Path file, String text) {
        try {
            Files.createDirectories(file.getParent());
            Files.writeString(file, text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Writes a shell script that can be executed. */
    static void program(Path file, String script) throws IOException {
        write(file, "#!/bin/sh\n" + script);
        executable(file);
    }

    private static void executable(Path file) throws IOException {
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rwxr-xr-x"));
    }

    private static Path onPath(String tool) {
        return Arrays.stream(System.getenv("PATH").split(":"))
                .map(folder -> Path.of(folder, tool))
                .filter(Files::isExecutable)
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("the tests need " + tool + " on PATH"));
    }
}
