package sill.tests.benchmark;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import sill.tests.Clone;

/**
 * Times tolerance runs through a worksheet's own Java beside hand-written loops over the same formulas, and the time that a
 * tolerance cell adds to {@code sill run}. Each contender runs in fresh processes, with the flags that a worker of a sheet with
 * tolerance cells has; the contenders alternate, the figures are medians, and the ratios are ratios of medians.
 *
 * <p>What one thread does is judged by processor time of the whole process, for other work of the machine adds to the time
 * passed, but little to that. What two threads are worth shows in the time passed alone; beside it stands what the machine had
 * for two hand-written loops at the same moments.
 */
public final class StudyBenchmark {
    private static final List<String> WORKER_FLAGS =
            List.of("-Xmx512m", "-Xss16m", "-XX:+UseSerialGC", "-XX:+UseTransparentHugePages", "-XX:-UsePerfData");

    private final Extent extent;
    private final Path folder;
    private final Path javaHome = Path.of(System.getProperty("java.home"));
    private final Workload usual = new Workload(9);
    private final List<Figure> figures = new ArrayList<>();
    private final Map<StudySheet, SheetStudy> studies = new HashMap<>();

    /**
     * How much is measured.
     *
     * @param rounds how many processes of each contender
     * @param repetitions how often each does its work, after it has got warm
     * @param warmUp milliseconds to get warm, for each work
     * @param samples of a work
     * @param few samples of the small memory figure
     * @param many samples of the large memory figure
     * @param cold samples of the tolerance cell
     */
    record Extent(int rounds, int repetitions, int warmUp, int samples, int few, int many, int cold) {}

    private StudyBenchmark(Extent extent, Path folder) throws IOException {
        this.extent = extent;
        this.folder = Files.createDirectories(folder);
    }

    /**
     * Prints the table and writes it to {@code tests/target/benchmark/study.txt}.
     *
     * @param arguments the number of processes of each contender, if another than 3 is wanted, and the samples of the large
     *     memory figure, if others than 10^8
     */
    public static void main(String[] arguments) throws IOException, InterruptedException {
        int rounds = arguments.length < 1 ? 3 : Integer.parseInt(arguments[0]);
        int many = arguments.length < 2 ? 100_000_000 : Integer.parseInt(arguments[1]);
        Path folder = Clone.root().resolve("tests/target/benchmark");
        String heading = String.format(
                Locale.ROOT,
                "Java %s on %s %s, %d processors; medians of %d alternating processes",
                System.getProperty("java.version"),
                System.getProperty("os.name"),
                System.getProperty("os.arch"),
                Runtime.getRuntime().availableProcessors(),
                rounds);
        Extent extent = new Extent(rounds, 5, 1000, 1_000_000, 100_000, many, 200_000);
        String table = Figure.table(heading, measure(extent, folder));
        Files.writeString(folder.resolve("study.txt"), table);
        System.out.print(table);
    }

    /**
     * Measures all figures.
     *
     * @param folder where the contenders' files go
     */
    static List<Figure> measure(Extent extent, Path folder) throws IOException, InterruptedException {
        StudyBenchmark benchmark = new StudyBenchmark(extent, folder);
        benchmark.oneThread();
        benchmark.twoThreads();
        benchmark.corners();
        benchmark.memory();
        benchmark.coldRun();
        return benchmark.figures;
    }

    private void oneThread() throws IOException, InterruptedException {
        StudySheet sheet = StudySheet.tripPoints();
        Contender through =
                rounds("a  sheet's Java", StudyRounds.Task.SHEET, sheet, extent.samples, extent.repetitions);
        Contender byHand = rounds("b  by hand", StudyRounds.Task.HAND, sheet, extent.samples, extent.repetitions);
        Contender sums = rounds("c  sums", StudyRounds.Task.SUMS, sheet, extent.samples, 4 * extent.repetitions);
        Map<Contender, double[]> times = alternating(List.of(through, byHand, sums));
        double a = times.get(through)[0];
        double b = times.get(byHand)[0];
        double c = times.get(sums)[0];
        String each = " " + extent.samples + " samples, processor time";
        figures.add(new Figure("a  sheet's Java, one thread:" + each, a, "ms"));
        figures.add(new Figure("b  hand-written loop, keeping and sorting:" + each, b, "ms"));
        figures.add(new Figure("c  hand-written loop, adding alone:" + each, c, "ms"));
        figures.add(new Figure("rate of a / rate of b", b / a, "", 0.9, true));
        figures.add(
                new Figure("rate of a / rate of b, by time passed", times.get(byHand)[1] / times.get(through)[1], ""));
        figures.add(new Figure("rate of a / rate of c", c / a, ""));
    }

    private void twoThreads() throws IOException, InterruptedException {
        Contender cores =
                rounds("cores", StudyRounds.Task.CORES, StudySheet.tripPoints(), extent.samples, extent.repetitions);
        double[] times = alternating(List.of(cores)).get(cores);
        figures.add(new Figure("d  sheet's Java, one thread: time passed", times[1], "ms"));
        figures.add(new Figure("e  sheet's Java, two threads: time passed", times[3], "ms"));
        double gain = times[1] / times[3];
        double machine = 2 * times[5] / times[7];
        figures.add(new Figure("rate of e / rate of d", gain, "", 1.8, true));
        figures.add(new Figure("rate of two hand-written loops at once / of one", machine, ""));
        figures.add(new Figure("the former as a share of the latter", gain / machine, "", 0.9, true));
        figures.add(new Figure("processor time of e / of d", times[2] / times[0], ""));
        figures.add(new Figure("processors that e had", times[2] / times[3], ""));
    }

    private void corners() throws IOException, InterruptedException {
        StudySheet sheet = StudySheet.dividers();
        // The sampled works take as long as dozens of these.
        int repetitions = 40 * extent.repetitions;
        Contender through = rounds("f", StudyRounds.Task.CORNERS, sheet, 1, repetitions);
        Contender byHand = rounds("g", StudyRounds.Task.HAND_CORNERS, sheet, 1, repetitions);
        Map<Contender, double[]> times = alternating(List.of(through, byHand));
        double f = times.get(through)[0];
        double g = times.get(byHand)[0];
        figures.add(new Figure("f  sheet's Java, worst case of 16 givens: processor time", 1000 * f, "µs"));
        figures.add(new Figure("g  hand-written loop over the 2^16 corners: processor time", 1000 * g, "µs"));
        figures.add(new Figure("f / g", f / g, "", 1.3));
    }

    private void memory() throws IOException, InterruptedException {
        if (!PeakMemory.canBeMeasured()) {
            System.out.println("Peak memory is measured on Linux alone.");
            return;
        }
        StudySheet sheet = StudySheet.tripPoints();
        double h = peak(rounds("few", StudyRounds.Task.ONCE, sheet, extent.few, 0));
        double i = peak(rounds("some", StudyRounds.Task.ONCE, sheet, extent.samples, 0));
        double j = peak(rounds("many", StudyRounds.Task.ONCE, sheet, extent.many, 0));
        figures.add(new Figure("h  peak memory, a JVM with the study alone: " + extent.few + " samples", h, "MiB"));
        figures.add(new Figure("i  the same, " + extent.samples + " samples", i, "MiB"));
        figures.add(new Figure("j  the same, " + extent.many + " samples", j, "MiB"));
        figures.add(new Figure("j / h", j / h, ""));
        figures.add(new Figure("j / i", j / i, ""));
        SillCommand sill = new SillCommand(folder, javaHome);
        double k = peak(
                sill.run("few", "few.sill", usual.worksheetWithTolerances("monte-carlo " + extent.few + " seed 41")));
        double l = peak(sill.run(
                "many", "many.sill", usual.worksheetWithTolerances("monte-carlo " + extent.many + " seed 41")));
        figures.add(new Figure("k  peak memory, all processes of sill run: " + extent.few + " samples", k, "MiB"));
        figures.add(new Figure("l  the same, " + extent.many + " samples", l, "MiB"));
        figures.add(new Figure("l / k", l / k, ""));
    }

    private double peak(Contender contender) throws IOException, InterruptedException {
        return contender.peakMemory().proportional();
    }

    private void coldRun() throws IOException, InterruptedException {
        SillCommand sill = new SillCommand(folder, javaHome);
        String sampling = "monte-carlo " + extent.cold + " seed 41";
        Contender without = sill.run("without", "usual.sill", usual.worksheet());
        Contender sampled = sill.run("sampled", "sampled.sill", usual.worksheetWithTolerances(sampling));
        Contender all = sill.run("all", "all.sill", usual.worksheetWithTolerances("worst-case, rss, " + sampling));
        sill.makeArchives();
        List<Contender> contenders = List.of(without, sampled, all);
        Map<Contender, List<Double>> times = new HashMap<>();
        for (int round = extent.rounds == 1 ? 1 : 0; round <= extent.rounds; round++) {
            for (Contender contender : contenders) {
                double milliseconds = contender.run().milliseconds();
                if (round > 0) {
                    times.computeIfAbsent(contender, each -> new ArrayList<>()).add(milliseconds);
                }
            }
        }
        double m = Median.of(times.get(without));
        double n = Median.of(times.get(sampled));
        double o = Median.of(times.get(all));
        figures.add(new Figure("m  sill run: " + usual.javaLines() + " Java lines", m, "ms"));
        figures.add(new Figure("n  the same and " + extent.cold + " samples of three results", n, "ms"));
        figures.add(new Figure("o  the same, worst case and root sum square too", o, "ms"));
        figures.add(new Figure("(n - m) / m", (n - m) / m, "", 0.8));
        figures.add(new Figure("(o - m) / m", (o - m) / m, ""));
    }

    /** Medians over the rounds of what each contender printed. */
    private Map<Contender, double[]> alternating(List<Contender> contenders) throws IOException, InterruptedException {
        Map<Contender, List<double[]>> printed = new HashMap<>();
        for (int round = 0; round < extent.rounds; round++) {
            for (Contender contender : contenders) {
                double[] numbers = Stream.of(contender.run().out().strip().split("\\s+"))
                        .mapToDouble(Double::parseDouble)
                        .toArray();
                printed.computeIfAbsent(contender, each -> new ArrayList<>()).add(numbers);
            }
        }
        Map<Contender, double[]> medians = new HashMap<>();
        printed.forEach((contender, rounds) -> {
            double[] median = new double[rounds.get(0).length];
            for (int i = 0; i < median.length; i++) {
                int at = i;
                median[i] =
                        Median.of(rounds.stream().map(numbers -> numbers[at]).toList());
            }
            medians.put(contender, median);
        });
        return medians;
    }

    private Contender rounds(String name, StudyRounds.Task task, StudySheet sheet, int samples, int repetitions)
            throws IOException {
        SheetStudy study = studies.get(sheet);
        if (study == null) {
            study = SheetStudy.of(sheet, folder);
            studies.put(sheet, study);
        }
        List<String> command = new ArrayList<>();
        command.add(javaHome.resolve("bin/java").toString());
        command.addAll(WORKER_FLAGS);
        command.addAll(List.of("-cp", classPath(), StudyRounds.class.getName()));
        command.addAll(List.of(
                task.name(),
                study.classes().toString(),
                study.slice(),
                Integer.toString(samples),
                Integer.toString(repetitions),
                Integer.toString(extent.warmUp)));
        return new Contender(name, command, Files.writeString(folder.resolve("none"), ""), javaHome);
    }

    private static String classPath() throws IOException {
        Path root = Clone.root();
        return Stream.concat(
                        Stream.of(root.resolve("tests/target/test-classes"), root.resolve("engine/target/classes")),
                        SheetStudy.libraries().stream())
                .map(Path::toString)
                .collect(Collectors.joining(File.pathSeparator));
    }
}
