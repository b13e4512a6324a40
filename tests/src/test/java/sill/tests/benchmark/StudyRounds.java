package sill.tests.benchmark;

import com.sun.management.OperatingSystemMXBean;
import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import sill.study.Sampling;

/**
 * A process of {@link StudyBenchmark}: does one thing again and again, and prints what it took. The JVM compiles in it what
 * this one thing needs and nothing else.
 *
 * <p>Arguments: a {@link Task}, the folder of the slice's class files, the slice's class, samples, how often the work is
 * timed, milliseconds to get warm. For each of its works it prints the mean of milliseconds of processor time of the whole
 * process (told in steps of some milliseconds, which a median would show), and the median of milliseconds passed.
 */
public final class StudyRounds {
    private static final OperatingSystemMXBean MACHINE =
            ManagementFactory.getPlatformMXBean(OperatingSystemMXBean.class);
    private static final long SEED = 7;

    /** Milliseconds of processor time that can be told. */
    private static final double LEAST = 50;

    private final SheetStudy tripPoints;
    private final SheetStudy dividers;
    private final int samples;
    private double checksum;

    private StudyRounds(Path classes, String slice, int samples) {
        tripPoints = new SheetStudy(StudySheet.tripPoints(), classes, slice);
        dividers = new SheetStudy(StudySheet.dividers(), classes, slice);
        this.samples = samples;
    }

    /** What a process is to do; several works take turns. */
    enum Task {
        SHEET,
        HAND,
        SUMS,
        CORES,
        CORNERS,
        HAND_CORNERS,
        /** Once, for memory is looked at from outside. */
        ONCE
    }

    private interface Work {
        double run() throws InterruptedException;
    }

    /** Does what the arguments say. */
    public static void main(String[] arguments) throws InterruptedException {
        StudyRounds rounds = new StudyRounds(Path.of(arguments[1]), arguments[2], Integer.parseInt(arguments[3]));
        Task task = Task.valueOf(arguments[0]);
        if (task == Task.ONCE) {
            rounds.sampled(2);
        } else {
            rounds.time(rounds.works(task), Integer.parseInt(arguments[4]), Integer.parseInt(arguments[5]));
        }
    }

    private List<Work> works(Task task) {
        return switch (task) {
            case SHEET -> List.of(() -> sampled(1));
            case HAND -> List.of(this::byHand);
            case SUMS ->
                List.of(() -> {
                    double[] means = HandWritten.tripPointSums(samples, SEED);
                    return means[0] + means[1] + means[2];
                });
            case CORES -> List.of(() -> sampled(1), () -> sampled(2), this::byHand, this::twoByHand);
            case CORNERS ->
                List.of(() -> dividers.run(Optional.empty(), 1)
                        .get(0)
                        .worstCase()
                        .orElseThrow()
                        .low()
                        .value());
            case HAND_CORNERS -> {
                double[] low = StudySheet.dividers().lows();
                double[] high = StudySheet.dividers().highs();
                yield List.of(() -> HandWritten.dividerCorners(low, high)[0]);
            }
            case ONCE -> List.of();
        };
    }

    private double sampled(int cores) throws InterruptedException {
        return tripPoints
                .run(Optional.of(new Sampling(samples, SEED)), cores)
                .get(0)
                .monteCarlo()
                .orElseThrow()
                .statistics()
                .orElseThrow()
                .mean()
                .value();
    }

    private double byHand() {
        return HandWritten.tripPoints(samples, SEED)[0][0];
    }

    /** The hand-written loop on two threads at once, each with all samples: what two cores of the machine are worth now. */
    private double twoByHand() throws InterruptedException {
        Thread second = new Thread(this::byHand);
        second.start();
        double first = byHand();
        second.join();
        return first;
    }

    private void time(List<Work> works, int times, int warmUp) throws InterruptedException {
        long begin = System.nanoTime();
        do {
            for (Work work : works) {
                checksum += work.run();
            }
        } while (System.nanoTime() - begin < warmUp * 1_000_000L * works.size());
        double[] processor = new double[works.size()];
        List<List<Double>> passed = new ArrayList<>();
        works.forEach(work -> passed.add(new ArrayList<>()));
        for (int i = 0; i < times || DoubleStream.of(processor).min().orElseThrow() < LEAST; i++) {
            for (int k = 0; k < works.size(); k++) {
                long cpu = MACHINE.getProcessCpuTime();
                long start = System.nanoTime();
                checksum += works.get(k).run();
                passed.get(k).add((System.nanoTime() - start) / 1e6);
                processor[k] += (MACHINE.getProcessCpuTime() - cpu) / 1e6;
            }
        }
        for (int k = 0; k < works.size(); k++) {
            System.out.println(processor[k] / passed.get(k).size() + " " + Median.of(passed.get(k)));
        }
        if (!Double.isFinite(checksum)) {
            throw new IllegalStateException("a work gave no finite number");
        }
    }
}
