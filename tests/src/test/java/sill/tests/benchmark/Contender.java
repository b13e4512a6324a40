package sill.tests.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * A command to be timed from its start to its end.
 *
 * @param name what the table calls it
 * @param command the program and its arguments
 * @param input the file it reads as standard input; may be empty
 * @param javaHome the JDK it shall use
 */
record Contender(String name, List<String> command, Path input, Path javaHome) {
    /** What one run took and printed. */
    record Run(double milliseconds, String out) {}

    /**
     * Runs once.
     *
     * @throws IllegalStateException when it does not end with 0; the message holds what it printed
     */
    Run run() throws IOException, InterruptedException {
        Path out = Files.createTempFile("benchmark", ".out");
        try {
            long begin = System.nanoTime();
            int code = start(out).waitFor();
            double milliseconds = (System.nanoTime() - begin) / 1e6;
            String printed = Files.readString(out);
            if (code != 0) {
                throw new IllegalStateException(name + " ended with " + code + ":\n" + printed);
            }
            return new Run(milliseconds, printed);
        } finally {
            Files.delete(out);
        }
    }

    /** Runs once, looking at the memory instead of the time. */
    PeakMemory peakMemory() throws IOException, InterruptedException {
        Path out = Files.createTempFile("benchmark", ".out");
        try {
            return PeakMemory.of(start(out));
        } finally {
            Files.delete(out);
        }
    }

    private Process start(Path out) throws IOException {
        ProcessBuilder builder = new ProcessBuilder(command)
                .redirectInput(input.toFile())
                .redirectErrorStream(true)
                .redirectOutput(out.toFile());
        builder.environment().put("JAVA_HOME", javaHome.toString());
        builder.environment().keySet().removeAll(List.of("JAVA_TOOL_OPTIONS", "JDK_JAVA_OPTIONS", "_JAVA_OPTIONS"));
        return builder.start();
    }
}
