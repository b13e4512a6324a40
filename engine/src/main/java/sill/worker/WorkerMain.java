package sill.worker;

import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.File;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import sill.sheet.Compiler;
import sill.sheet.Place;
import sill.sheet.TranslatedSheet;
import sill.sheet.Translation;
import sill.worksheet.Problem;

/**
 * The worker process. It reads one {@link Job} from its standard input, and writes {@link Report}s to what was its standard
 * output before worksheet code could reach it.
 */
public final class WorkerMain {
    private final DataOutputStream reports;
    private final CapturedOutput output;
    private final Compiler compiler;
    private final Evaluator evaluator;

    private WorkerMain(DataOutputStream reports, CapturedOutput output, List<Path> classPath) {
        this.reports = reports;
        this.output = output;
        this.compiler = new Compiler(classPath);
        this.evaluator = new Evaluator(compiler);
    }

    /**
     * Starts a worker.
     *
     * @param arguments the class path of worksheet code
     */
    public static void main(String[] arguments) throws IOException {
        CapturedOutput output = new CapturedOutput();
        DataOutputStream reports = new DataOutputStream(
                new java.io.BufferedOutputStream(new FileOutputStream(FileDescriptor.out), 1 << 16));
        System.setOut(output.stream());
        System.setErr(output.stream());
        List<Path> classPath = Arrays.stream(arguments[0].split(File.pathSeparator))
                .map(Path::of)
                .toList();
        WorkerMain worker = new WorkerMain(reports, output, classPath);
        DataInputStream in = new DataInputStream(System.in);
        byte[] job = in.readNBytes(in.readInt());
        try {
            worker.run(Job.of(job));
        } catch (ReflectiveOperationException | RuntimeException | StackOverflowError e) {
            worker.report(new Report.Failed(e + " at " + Arrays.toString(Arrays.copyOf(e.getStackTrace(), 5))));
        }
        reports.flush();
        // Threads that worksheet code left behind must not keep the process.
        System.exit(0);
    }

    private void report(Report report) {
        byte[] bytes = report.bytes();
        try {
            reports.writeInt(bytes.length);
            reports.write(bytes);
            reports.flush();
        } catch (IOException e) {
            // The parent is gone; there is nobody to work for.
            Runtime.getRuntime().halt(1);
        }
    }

    private void run(Job job) throws ReflectiveOperationException {
        report(new Report.Begun(0, new Place(1, 1)));
        GivenValues givens = GivenValues.of(job);
        Translation translation = Translation.of(givens.source(), compiler, evaluator.splitter());
        TranslatedSheet sheet = translation.sheet();
        Evaluator.Evaluation evaluation = evaluator.evaluate(sheet);
        while (evaluation.sheet() == null) {
            boolean less = false;
            for (Evaluator.Rejection rejection : evaluation.rejections()) {
                less |= translation.leaveOut(sheet.code(), rejection.offset(), rejection.message());
            }
            if (!less) {
                throw new IllegalStateException("the sheet's class was refused: " + evaluation.rejections());
            }
            sheet = translation.sheet();
            evaluation = evaluator.evaluate(sheet);
        }
        List<Problem> problems = new ArrayList<>(givens.problems());
        problems.addAll(sheet.problems());
        report(new Report.Translated(problems));
        givens.set(evaluation.sheet());
        new StepRunner(sheet, evaluation.sheet(), job.leftOut(), output, this::report).run(givens.present());
    }
}
