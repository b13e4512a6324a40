package sill.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.Function;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import sill.record.Assembly;
import sill.record.DesignRecord;
import sill.record.DesignRecord.DataFile;
import sill.record.DesignRecord.Made;
import sill.record.DesignRecord.Source;
import sill.record.html.RecordPage;
import sill.values.RunResult;
import sill.worker.Pace;
import sill.worker.SheetRun;
import sill.worksheet.DataFiles;
import sill.worksheet.Worksheet;

/** {@code sill run}: worksheets to records. */
@Command(
        name = "run",
        mixinStandardHelpOptions = true,
        description = "Runs worksheets and writes a record of each, as a page and as JSON.")
final class RunCommand implements Callable<Integer> {
    private final Terminal terminal;
    private final EarlyWorker early;
    private final StopKey stopKey;

    @Parameters(arity = "1..*", paramLabel = "SHEET", description = "worksheet files")
    private List<Path> sheets;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            description = "folder for the records (default: beside each worksheet)")
    private Path out;

    @Option(names = "--quiet", description = "print nothing but errors")
    private boolean quiet;

    @Mixin
    private LimitOptions limits;

    RunCommand(Terminal terminal, EarlyWorker early, StopKey stopKey) {
        this.stopKey = stopKey;
        this.terminal = terminal;
        this.early = early;
    }

    @Override
    public Integer call() throws InterruptedException {
        int worst = ExitCode.HOLDS;
        for (Path sheet : sheets) {
            if (!stopKey.isPressed()) {
                worst = Math.max(worst, run(sheet));
            }
        }
        return worst;
    }

    private int run(Path path) throws InterruptedException {
        try {
            SheetFile file = SheetFile.read(path);
            RecordFiles files = new RecordFiles(out == null ? file.folder() : out, file.baseName());
            DesignRecord record = record(file);
            files.write(record);
            if (!quiet) {
                new RunReport(terminal, record).print(files.page());
            }
            return ExitCode.of(record.outcome());
        } catch (Unusable e) {
            terminal.error(e.getMessage(), e.mend());
            return ExitCode.UNUSABLE;
        } catch (IOException e) {
            terminal.error(
                    "the worker process can't be started: " + e.getMessage(),
                    "check the free memory and the temporary folder");
            return ExitCode.UNUSABLE;
        }
    }

    private DesignRecord record(SheetFile file) throws IOException, InterruptedException {
        Worksheet worksheet = Worksheet.parse(file.text());
        DataFiles data = DataFiles.read(worksheet, file.folder());
        List<DataFile> files = data.bytes().entrySet().stream()
                .map(entry -> new DataFile(entry.getKey(), sha256(entry.getValue()), entry.getValue()))
                .toList();
        Source source = new Source(file.name(), sha256(file.bytes()), file.text());
        Made made = new Made(Version.sill(), Version.java(), now());
        Function<RunResult, DesignRecord> assemble =
                result -> Assembly.record(worksheet, source, files, data.problems(), result, made);
        rehearse(assemble);
        try (SheetRun run = early.take(limits.limits(), Pace.of(file.text()));
                RunProgress progress = new RunProgress(terminal, worksheet)) {
            stopKey.running(run);
            return assemble.apply(run.run(worksheet, data.bytes(), progress));
        }
    }

    /** Writes the record of a run that gave nothing: while the worker works, all that a page needs gets loaded. */
    private static void rehearse(Function<RunResult, DesignRecord> assemble) {
        Thread rehearsal = new Thread(() -> RecordPage.write(assemble.apply(RunResult.NOTHING)), "rehearsal");
        rehearsal.setDaemon(true);
        rehearsal.start();
    }

    /** Now, or the moment named in {@code SOURCE_DATE_EPOCH}, for builds that must repeat themselves. */
    private static String now() {
        Optional<Instant> named = Optional.ofNullable(System.getenv("SOURCE_DATE_EPOCH"))
                .filter(text -> text.matches("\\d{1,11}"))
                .map(text -> Instant.ofEpochSecond(Long.parseLong(text)));
        return named.orElseGet(Instant::now).truncatedTo(ChronoUnit.SECONDS).toString();
    }

    private static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
