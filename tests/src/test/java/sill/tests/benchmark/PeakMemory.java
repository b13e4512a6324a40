package sill.tests.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;

/**
 * The most memory that a process and all below it held together at one time, as Linux tells it: the proportional set size,
 * in which a page shared by two of them counts once, and the resident set size, in which it counts twice. Sampled, so a
 * peak of a few milliseconds may be missed.
 *
 * @param proportional MiB
 * @param resident MiB
 */
record PeakMemory(double proportional, double resident) {
    private static final long MILLISECONDS_BETWEEN = 5;

    static boolean canBeMeasured() {
        return Files.isReadable(Path.of("/proc/self/smaps_rollup"));
    }

    /** Samples until the process has ended. */
    static PeakMemory of(Process process) throws InterruptedException {
        PeakMemory peak = new PeakMemory(0, 0);
        while (process.isAlive()) {
            PeakMemory now = Stream.concat(Stream.of(process.toHandle()), process.descendants())
                    .map(handle -> now(handle.pid()))
                    .reduce(new PeakMemory(0, 0), PeakMemory::plus);
            peak = new PeakMemory(Math.max(peak.proportional, now.proportional), Math.max(peak.resident, now.resident));
            Thread.sleep(MILLISECONDS_BETWEEN);
        }
        return peak;
    }

    private PeakMemory plus(PeakMemory other) {
        return new PeakMemory(proportional + other.proportional, resident + other.resident);
    }

    private static PeakMemory now(long pid) {
        try (Stream<String> lines = Files.lines(Path.of("/proc", Long.toString(pid), "smaps_rollup"))) {
            double[] mebibytes = new double[2];
            lines.forEach(line -> {
                if (line.startsWith("Pss:")) {
                    mebibytes[0] = mebibytes(line);
                } else if (line.startsWith("Rss:")) {
                    mebibytes[1] = mebibytes(line);
                }
            });
            return new PeakMemory(mebibytes[0], mebibytes[1]);
        } catch (IOException | java.io.UncheckedIOException e) {
            return new PeakMemory(0, 0); // It has ended since it was listed.
        }
    }

    /** Of a line such as {@code Pss:      51234 kB}. */
    private static double mebibytes(String line) {
        return Double.parseDouble(line.replaceAll("[^0-9]", "")) / 1024;
    }
}
