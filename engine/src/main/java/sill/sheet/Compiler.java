package sill.sheet;

import com.sun.source.util.JavacTask;
import java.io.IOException;
import java.io.StringWriter;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import javax.tools.Diagnostic;
import javax.tools.DiagnosticCollector;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.StandardLocation;
import javax.tools.ToolProvider;

/** The JDK's compiler with the options and the class path of worksheet code. */
public final class Compiler {
    /**
     * Same language on every JDK; the bare {@code -source} costs nothing where {@code --release} does. With
     * {@code -parameters} the compiler reads the names of the helpers' parameters too, in which their forms are written.
     */
    public static final List<String> OPTIONS = List.of(
            "-proc:none",
            "-parameters",
            "-source",
            "17",
            "-target",
            "17",
            "-Xlint:-options",
            // All errors: the compiler would stop counting at 100, and call what follows right.
            "-Xmaxerrs",
            "0",
            // A wrong type is no reason to keep quiet about a missing return.
            "-XDshould-stop.ifError=FLOW");

    private final JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    private final StandardJavaFileManager files;

    /**
     * A compiler that sees the JDK and a class path.
     *
     * @param classPath jars or folders that worksheet code may use
     */
    public Compiler(List<Path> classPath) {
        files = compiler.getStandardFileManager(null, Locale.ROOT, StandardCharsets.UTF_8);
        try {
            files.setLocationFromPaths(StandardLocation.CLASS_PATH, classPath);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /** The file manager, for a second user of the same class path. */
    public StandardJavaFileManager files() {
        return files;
    }

    /** A task over sources in memory, with what it will complain of. */
    Task task(List<String> sources) {
        List<Source> units = new ArrayList<>();
        for (int i = 0; i < sources.size(); i++) {
            units.add(new Source(i, sources.get(i)));
        }
        DiagnosticCollector<JavaFileObject> complaints = new DiagnosticCollector<>();
        // A writer of its own keeps the compiler from ever printing.
        JavacTask task = (JavacTask) compiler.getTask(new StringWriter(), files, complaints, OPTIONS, null, units);
        return new Task(task, complaints);
    }

    /** The classes of a text, by name; nothing when it has an error. */
    Optional<Map<String, byte[]>> compile(String source) {
        ClassesInMemory classes = new ClassesInMemory(files);
        JavacTask task = (JavacTask) compiler.getTask(
                new StringWriter(),
                classes,
                new DiagnosticCollector<>(),
                OPTIONS,
                null,
                List.of(new Source(0, source)));
        return task.call() ? Optional.of(classes.bytes()) : Optional.empty();
    }

    /** A compiler task and its complaints. */
    record Task(JavacTask task, DiagnosticCollector<JavaFileObject> complaints) {
        /** Errors so far, in the order of the sources. */
        List<Complaint> errors() {
            return complaints.getDiagnostics().stream()
                    .filter(d -> d.getKind() == Diagnostic.Kind.ERROR)
                    .map(Complaint::of)
                    .toList();
        }
    }

    /**
     * An error.
     *
     * @param source index of the source
     * @param offset where in it
     * @param code the compiler's key, or {@link Wording#OURS}
     * @param message the compiler's words, in English
     */
    public record Complaint(int source, int offset, String code, String message) {
        /** A complaint about the only source. */
        public Complaint(int offset, String code, String message) {
            this(0, offset, code, message);
        }

        static Complaint ours(String message) {
            return new Complaint(0, Wording.OURS, message);
        }

        static Complaint of(Diagnostic<? extends JavaFileObject> d) {
            int source = d.getSource() instanceof Source s ? s.index : -1;
            return new Complaint(source, (int) d.getPosition(), d.getCode(), d.getMessage(Locale.ENGLISH));
        }
    }

    private static final class Source extends SimpleJavaFileObject {
        private final int index;
        private final String text;

        Source(int index, String text) {
            super(URI.create("sheet:///S" + index + ".java"), Kind.SOURCE);
            this.index = index;
            this.text = text;
        }

        /** The sheet's class is public and its source has no file. */
        @Override
        public boolean isNameCompatible(String simpleName, Kind kind) {
            return true;
        }

        @Override
        public CharSequence getCharContent(boolean ignoreEncodingErrors) {
            return text;
        }
    }
}
