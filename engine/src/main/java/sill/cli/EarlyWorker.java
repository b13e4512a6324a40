package sill.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import sill.worker.Limits;
import sill.worker.Pace;
import sill.worker.SheetRun;

/**
 * A worker that starts while the command line is still being read: reading it takes about as long as a worker needs to get
 * ready. It serves the first worksheet, unless that wants another one.
 */
final class EarlyWorker implements AutoCloseable {
    private static final List<String> NOT_FOR = List.of("--memory", "--help", "-h", "--version", "-V");

    private SheetRun ready;

    private EarlyWorker(SheetRun ready) {
        this.ready = ready;
    }

    static EarlyWorker none() {
        return new EarlyWorker(null);
    }

    static EarlyWorker forCommand(String... arguments) {
        boolean runs = arguments.length > 1
                && arguments[0].equals("run")
                && Arrays.stream(arguments)
                        .noneMatch(argument -> NOT_FOR.stream().anyMatch(argument::startsWith));
        try {
            return runs ? new EarlyWorker(SheetRun.start(Limits.DEFAULT, pace(arguments))) : none();
        } catch (IOException e) {
            // Whoever takes a worker tries again and says why there is none.
            return none();
        }
    }

    /** What the first worksheet among the arguments calls for; one that can't be read will be told of later. */
    private static Pace pace(String... arguments) {
        for (String argument : arguments) {
            try {
                if (argument.endsWith(".sill")) {
                    return Pace.of(Files.readString(Path.of(argument)));
                }
            } catch (IOException | InvalidPathException e) {
                return Pace.QUICK_START;
            }
        }
        return Pace.QUICK_START;
    }

    /** A worker: the early one the first time, when it fits, else a new one. */
    SheetRun take(Limits limits, Pace pace) throws IOException {
        SheetRun early = ready;
        ready = null;
        if (early != null && early.pace() == pace && limits.memoryMegabytes() == Limits.DEFAULT.memoryMegabytes()) {
            return early.within(limits);
        }
        if (early != null) {
            early.close();
        }
        return SheetRun.start(limits, pace);
    }

    @Override
    public void close() {
        if (ready != null) {
            ready.close();
        }
    }
}
