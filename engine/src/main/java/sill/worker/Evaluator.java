package sill.worker;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import jdk.jshell.Diag;
import jdk.jshell.JShell;
import jdk.jshell.Snippet;
import jdk.jshell.SnippetEvent;
import jdk.jshell.execution.DirectExecutionControl;
import jdk.jshell.spi.ExecutionControl;
import jdk.jshell.spi.ExecutionControlProvider;
import jdk.jshell.spi.ExecutionEnv;
import sill.sheet.Compiler;
import sill.sheet.Splitter;
import sill.sheet.TranslatedSheet;
import sill.sheet.Translation;

/**
 * Evaluates a sheet's class, once, in this process. It gets ready on a thread of its own, with files of its own: a sheet is
 * translated in the meantime.
 */
final class Evaluator implements AutoCloseable {
    private final SheetLoader loader = new SheetLoader();
    private final FutureTask<JShell> shell;

    /** Starts to get ready; {@code classPath} is what worksheet code may use. */
    Evaluator(List<Path> classPath) {
        shell = new FutureTask<>(() -> withImports(classPath));
        Thread start = new Thread(shell, "evaluator");
        start.setDaemon(true);
        start.start();
    }

    private JShell withImports(List<Path> classPath) {
        JShell started = JShell.builder()
                .executionEngine(new Engine(), Map.of())
                .fileManager(standard -> new Compiler(classPath).files())
                .compilerOptions(Compiler.OPTIONS.toArray(String[]::new))
                .build();
        Translation.IMPORTS.forEach(name -> started.eval("import " + name + ";"));
        return started;
    }

    /** The evaluated class's cells can be called, or the rejections say why not. */
    record Evaluation(Class<?> sheet, List<Compiler.Complaint> rejections) {}

    Splitter splitter() {
        return new PromptSplitter(() -> shell().sourceCodeAnalysis());
    }

    /** Evaluates the sheet's own imports, then its class. */
    Evaluation evaluate(TranslatedSheet sheet) throws ClassNotFoundException {
        JShell shell = shell();
        sheet.imports().forEach(shell::eval);
        List<SnippetEvent> events = shell.eval(sheet.code().text());
        List<Compiler.Complaint> rejections = new ArrayList<>();
        for (SnippetEvent event : events) {
            if (event.status() != Snippet.Status.VALID) {
                shell.diagnostics(event.snippet())
                        .filter(Diag::isError)
                        .forEach(d -> rejections.add(new Compiler.Complaint(
                                (int) d.getPosition(), d.getCode(), d.getMessage(Locale.ENGLISH))));
                shell.drop(event.snippet());
            }
        }
        return new Evaluation(rejections.isEmpty() ? loader.withSimpleName(sheet.className()) : null, rejections);
    }

    private JShell shell() {
        try {
            return shell.get();
        } catch (InterruptedException | ExecutionException e) {
            throw new IllegalStateException("the evaluator did not start", e);
        }
    }

    @Override
    public void close() {
        shell().close();
    }

    /** JShell's port to whatever runs the code: here, this process with our own loader. */
    private final class Engine implements ExecutionControlProvider {
        @Override
        public String name() {
            return "sill";
        }

        @Override
        public ExecutionControl generate(ExecutionEnv env, Map<String, String> parameters) {
            return new DirectExecutionControl(loader);
        }
    }
}
