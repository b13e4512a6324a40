package sill.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.ParameterException;

/** Sill's command line. */
@Command(
        name = "sill",
        description = "Runs worksheets of threshold-circuit designs and leaves records of them.",
        subcommands = {RunCommand.class, NewCommand.class},
        mixinStandardHelpOptions = true,
        versionProvider = Version.class,
        footer = {
            "",
            "Exit codes: 0 all checks hold, 1 a check fails, 2 the worksheet has problems or a cell did not finish,",
            "3 bad usage or a file that can't be read or written."
        })
public final class Main {
    private Main() {}

    /** Runs a command and ends the process with its exit code. */
    public static void main(String[] arguments) {
        PrintStream out = utf8(FileDescriptor.out);
        PrintStream err = utf8(FileDescriptor.err);
        int code;
        StopKey stopKey = new StopKey();
        stopKey.watch();
        try (EarlyWorker early = EarlyWorker.forCommand(arguments)) {
            code = run(new Terminal(out, err, System.console() != null), early, stopKey, out, err, arguments);
        }
        out.flush();
        err.flush();
        stopKey.ended();
        System.exit(code);
    }

    /**
     * Runs a command, for tests and other programs.
     *
     * @return its exit code
     */
    public static int run(PrintStream out, PrintStream err, String... arguments) {
        return run(new Terminal(out, err, false), EarlyWorker.none(), new StopKey(), out, err, arguments);
    }

    private static int run(
            Terminal terminal,
            EarlyWorker early,
            StopKey stopKey,
            PrintStream out,
            PrintStream err,
            String... arguments) {
        CommandLine line = new CommandLine(new Main(), new Factory(terminal, early, stopKey));
        line.setOut(new PrintWriter(out, true));
        line.setErr(new PrintWriter(err, true));
        line.setUsageHelpWidth(110);
        line.setParameterExceptionHandler(Main::usage);
        line.setExecutionExceptionHandler((failure, failed, parsed) -> {
            terminal.error(
                    "internal error: " + failure, "report it with the worksheet; earlier records are as they were");
            return ExitCode.UNUSABLE;
        });
        if (arguments.length == 0) {
            line.usage(line.getErr());
            return ExitCode.UNUSABLE;
        }
        return line.execute(arguments);
    }

    private static int usage(ParameterException bad, String[] arguments) {
        CommandLine line = bad.getCommandLine();
        line.getErr().println(Terminal.safe("sill: " + bad.getMessage()));
        line.getErr().println("  mend: see \"" + line.getCommandSpec().qualifiedName() + " --help\"");
        return ExitCode.UNUSABLE;
    }

    private static PrintStream utf8(FileDescriptor descriptor) {
        return new PrintStream(new FileOutputStream(descriptor), false, StandardCharsets.UTF_8);
    }

    /** Gives commands what they work with. */
    private record Factory(Terminal terminal, EarlyWorker early, StopKey stopKey) implements CommandLine.IFactory {
        @Override
        public <K> K create(Class<K> type) throws Exception {
            if (type == RunCommand.class) {
                return type.cast(new RunCommand(terminal, early, stopKey));
            }
            if (type == NewCommand.class) {
                return type.cast(new NewCommand(terminal));
            }
            return CommandLine.defaultFactory().create(type);
        }
    }
}
