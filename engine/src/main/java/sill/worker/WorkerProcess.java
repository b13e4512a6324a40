package sill.worker;

import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** A running worker, seen from the parent. What it says is data; a worker that talks nonsense is a dead one. */
final class WorkerProcess implements AutoCloseable {
    private static final int LARGEST_MESSAGE = 256 << 20;
    /** The start script keeps class-data-sharing archives; this is the worker's. */
    private static final String ARCHIVE = "worker.jsa";

    /** Where the start script wants the archive written, in the one run that does so. */
    private static final String TRAINING = System.getProperty("sill.cds.train", "");

    /** 128 and the number of the signal that a stop from the keyboard sends, to the worker too. */
    private static final int STOPPED_BY_KEY = 130;

    private static final int KEPT_ERROR_BYTES = 4096;

    private final Process process;
    private final Path folder;
    private final BlockingQueue<Heard> events = new LinkedBlockingQueue<>(1024);

    /**
     * How a worker ended.
     *
     * @param words how, as in {@code it ran out of memory}
     * @param hint how the worksheet's author may mend it
     * @param fault whether it is a fault of Sill unless a cell caused it
     */
    record End(String words, String hint, boolean fault) {}

    /** A report, the worker's end, or neither within the time. */
    record Heard(Optional<Report> report, Optional<End> end) {
        boolean timedOut() {
            return report.isEmpty() && end.isEmpty();
        }
    }

    private WorkerProcess(Process process, Path folder) {
        this.process = process;
        this.folder = folder;
    }

    /** Starts a worker; it gets ready while the parent does something else. */
    static WorkerProcess start(Limits limits, Pace pace) throws IOException {
        Path folder = Files.createTempDirectory("sill-worker");
        ProcessBuilder builder = new ProcessBuilder(command(limits, pace, folder));
        builder.environment().clear();
        builder.directory(folder.toFile());
        WorkerProcess worker = new WorkerProcess(builder.start(), folder);
        worker.listen();
        return worker;
    }

    private static List<String> command(Limits limits, Pace pace, Path folder) {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(List.of(
                "-Xmx" + limits.memoryMegabytes() + "m",
                "-Xss16m",
                "-XX:+UseSerialGC",
                // Where the system has them, fewer and larger pages save a sixth of a run.
                "-XX:+UseTransparentHugePages",
                "-XX:+ExitOnOutOfMemoryError",
                // Else the JVM's last words would stand among the reports.
                "-XX:+DisplayVMOutputToStderr",
                "-XX:-UsePerfData",
                "-Xshare:auto",
                "-Xlog:disable"));
        if (pace == Pace.QUICK_START) {
            command.add("-XX:TieredStopAtLevel=1");
        }
        String archives = System.getProperty("sill.cds", "");
        if (!archives.isEmpty()) {
            command.add("-XX:SharedArchiveFile=" + Path.of(archives, ARCHIVE));
        }
        if (!TRAINING.isEmpty()) {
            command.add("-XX:ArchiveClassesAtExit=" + Path.of(TRAINING, ARCHIVE));
        }
        command.addAll(List.of(
                "-Dfile.encoding=UTF-8",
                "-Duser.language=en",
                "-Duser.country=",
                "-Duser.timezone=UTC",
                "-Dline.separator=\n",
                "-Djava.awt.headless=true",
                "-Djava.io.tmpdir=" + folder,
                "-cp",
                absolute(System.getProperty("java.class.path")),
                WorkerMain.class.getName(),
                WorksheetClassPath.text()));
        return command;
    }

    /** The worker runs in a folder of its own. */
    private static String absolute(String classPath) {
        return Pattern.compile(File.pathSeparator, Pattern.LITERAL)
                .splitAsStream(classPath)
                .map(entry -> Path.of(entry).toAbsolutePath().toString())
                .collect(Collectors.joining(File.pathSeparator));
    }

    void send(Job job) throws IOException {
        byte[] bytes = job.bytes();
        DataOutputStream out = new DataOutputStream(process.getOutputStream());
        out.writeInt(bytes.length);
        out.write(bytes);
        out.flush();
    }

    /** Has the next report be that the run was stopped. */
    void stop() {
        events.clear();
        events.offer(new Heard(Optional.empty(), Optional.of(new End("the run was stopped", "Run again.", false))));
    }

    /** Waits for the next report. */
    Heard next(Duration atMost) throws InterruptedException {
        Heard heard = events.poll(atMost.toMillis(), TimeUnit.MILLISECONDS);
        return heard == null ? new Heard(Optional.empty(), Optional.empty()) : heard;
    }

    private void listen() {
        byte[][] lastErrors = {new byte[0]};
        Thread errors = new Thread(() -> lastErrors[0] = drain(process.getErrorStream()), "worker errors");
        errors.setDaemon(true);
        errors.start();
        Thread reports = new Thread(() -> readReports(errors, lastErrors), "worker reports");
        reports.setDaemon(true);
        reports.start();
    }

    private void readReports(Thread errors, byte[][] lastErrors) {
        Optional<End> end = Optional.empty();
        try {
            DataInputStream in =
                    new DataInputStream(new java.io.BufferedInputStream(process.getInputStream(), 1 << 16));
            while (true) {
                int length = in.readInt();
                if (length < 0 || length > LARGEST_MESSAGE) {
                    throw new WireIn.BadMessage("message of " + length + " bytes");
                }
                byte[] message = in.readNBytes(length);
                if (message.length < length) {
                    break;
                }
                events.put(new Heard(Optional.of(Report.of(message)), Optional.empty()));
            }
        } catch (IOException e) {
            // The stream ends when the process does; its exit status tells more.
        } catch (WireIn.BadMessage e) {
            end = Optional.of(new End(
                    "its worker sent what is no report: " + e.getMessage(),
                    "Leave the process's own output alone.",
                    true));
            process.destroyForcibly();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        try {
            errors.join(1000);
            int exit = process.waitFor();
            events.put(new Heard(Optional.empty(), end.or(() -> Optional.of(end(exit, lastErrors[0])))));
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private static End end(int exit, byte[] lastErrors) {
        if (new String(lastErrors, StandardCharsets.UTF_8).contains("OutOfMemoryError")) {
            return new End("it ran out of memory", "Keep fewer values, or allow more with --memory.", false);
        }
        if (exit == STOPPED_BY_KEY) {
            return new End("the run was stopped", "Run again.", false);
        }
        String ended = "its worker ended with status " + exit;
        return exit < 128
                ? new End(ended, "Leave out what ends the process, such as System.exit.", true)
                : new End(ended, "Something outside ended the process. Run again.", false);
    }

    private static byte[] drain(InputStream errors) {
        try (errors) {
            byte[] first = errors.readNBytes(KEPT_ERROR_BYTES);
            errors.transferTo(java.io.OutputStream.nullOutputStream());
            return first;
        } catch (IOException e) {
            return new byte[0];
        }
    }

    @Override
    public void close() {
        try {
            if (!TRAINING.isEmpty()) {
                // A worker writes its archive as it ends.
                process.waitFor(1, TimeUnit.MINUTES);
            }
            process.destroyForcibly();
            process.waitFor(5, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        try (Stream<Path> files = Files.walk(folder)) {
            files.sorted(Comparator.reverseOrder()).map(Path::toFile).forEach(File::delete);
        } catch (IOException e) {
            // A temporary folder that stays is no reason to lose a record.
        }
    }
}
