package sill.worker;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;
import java.util.regex.Pattern;
import sill.sheet.Compiler;
import sill.values.RunResult;
import sill.worksheet.Worksheet;

/** Runs worksheets for tests: in this process where that is enough, in a worker where the process matters. */
final class Sheets {
    /** Far more than any test's cell needs, also on a busy machine. */
    static final Limits AMPLE = new Limits(Duration.ofSeconds(60), 256);

    private static final List<Path> CLASS_PATH = Pattern.compile(java.io.File.pathSeparator)
            .splitAsStream(WorksheetClassPath.text())
            .map(Path::of)
            .toList();
    private static final Compiler COMPILER = new Compiler(CLASS_PATH);

    private Sheets() {}

    static List<Path> classPath() {
        return CLASS_PATH;
    }

    static Compiler compiler() {
        return COMPILER;
    }

    /** A worksheet of one calculation cell, which is cell 1 and starts on line 4. */
    static String calculation(String java) {
        return "sill 1\ntitle: T\n:: calc C\n" + java;
    }

    /** What the worksheet gives, computed in this process. */
    static RunResult here(String text) {
        Worksheet worksheet = Worksheet.parse(text);
        Gathered gathered = new Gathered(worksheet);
        reports(worksheet, Map.of(), gathered::take);
        return gathered.result();
    }

    /** All reports of a run in this process. */
    static List<Report> reports(String text, Map<String, byte[]> files) {
        List<Report> reports = new ArrayList<>();
        reports(Worksheet.parse(text), files, reports::add);
        return reports;
    }

    private static void reports(Worksheet worksheet, Map<String, byte[]> files, Consumer<Report> reports) {
        CapturedOutput output = new CapturedOutput();
        PrintStream before = System.out;
        System.setOut(output.stream());
        try (Evaluator evaluator = new Evaluator(CLASS_PATH)) {
            Job job = Job.of(JobWriter.job(worksheet, files, Set.of()).bytes());
            new JobRun(COMPILER, output, reports).run(job, evaluator);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(e);
        } finally {
            System.setOut(before);
        }
    }

    /** What the worksheet gives in a worker. */
    static RunResult inWorker(String text, Limits limits) {
        return inWorker(text, Map.of(), limits, Progress.SILENT);
    }

    static RunResult inWorker(String text, Map<String, byte[]> files, Limits limits, Progress progress) {
        try (SheetRun run = SheetRun.start(limits, Pace.QUICK_START)) {
            return run.run(Worksheet.parse(text), files, progress);
        } catch (IOException | InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }
}
