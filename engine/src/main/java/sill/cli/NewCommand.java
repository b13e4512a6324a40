package sill.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code sill new}: a small complete worksheet to start from. */
@Command(
        name = "new",
        mixinStandardHelpOptions = true,
        description = "Writes a small complete worksheet to start from. A file that exists is left alone.")
final class NewCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Parameters(paramLabel = "FILE", description = "the worksheet to write")
    private Path file;

    NewCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        try {
            if (Files.exists(file, LinkOption.NOFOLLOW_LINKS)) {
                throw new Unusable(file + " exists already", "choose another name");
            }
            Path folder = file.toAbsolutePath().getParent();
            if (folder == null || !Files.isDirectory(folder)) {
                throw new Unusable("there is no folder " + folder, "make it first, or check the path");
            }
            RecordFiles.replace(file, template());
            terminal.line("wrote " + file + "; run it with: sill run " + file);
            return ExitCode.HOLDS;
        } catch (Unusable e) {
            terminal.error(e.getMessage(), e.mend());
            return ExitCode.UNUSABLE;
        }
    }

    private static String template() throws IOException {
        try (InputStream in = NewCommand.class.getResourceAsStream("new.sill")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
