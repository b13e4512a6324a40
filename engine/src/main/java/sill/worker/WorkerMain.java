package sill.worker;

import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.File;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import sill.sheet.Compiler;

/**
 * The worker process. It reads one {@link Job} from its standard input, and writes {@link Report}s to what was its standard
 * output before worksheet code could reach it.
 */
public final class WorkerMain {
    private final DataOutputStream reports;
    private final Compiler compiler;
    private final Evaluator evaluator;

    private WorkerMain(DataOutputStream reports, List<Path> classPath) {
        this.reports = reports;
        this.evaluator = new Evaluator(classPath);
        this.compiler = new Compiler(classPath);
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
        WorkerMain worker = new WorkerMain(reports, classPath);
        DataInputStream in = new DataInputStream(System.in);
        byte[] job = in.readNBytes(in.readInt());
        // What worksheet code reads has an end.
        System.setIn(InputStream.nullInputStream());
        try {
            new JobRun(worker.compiler, output, worker::report).run(Job.of(job), worker.evaluator);
        } catch (Throwable thrown) {
            // Errors of the compiler among them: whatever it was, the parent is to know.
            worker.report(Report.Failed.of(thrown));
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
}
