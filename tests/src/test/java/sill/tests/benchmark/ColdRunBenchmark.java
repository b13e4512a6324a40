package sill.tests.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import sill.tests.Clone;

/**
 * Times {@code sill run} beside the JDK's source launcher and snippet prompt on the same Java, each in a fresh process. The
 * contenders alternate, so that what else the machine does falls on all of them; the figures are medians, and the ratios
 * are ratios of medians. Unless a single run is asked for, each runs
 * once before, untimed, and Sill's class-data-sharing archives are made before, as they
 * are after a user's first run.
 */
public final class ColdRunBenchmark {
    private static final int DEFAULT_RUNS = 7;

    private final int runs;
    private final Path folder;
    private final Path javaHome = Path.of(System.getProperty("java.home"));
    private final Path none;
    private final SillCommand sill;

    private ColdRunBenchmark(int runs, Path folder) throws IOException {
        this.runs = runs;
        this.folder = Files.createDirectories(folder);
        none = Files.writeString(folder.resolve("none"), "");
        sill = new SillCommand(this.folder, javaHome);
    }

    /**
     * Prints the table and writes it to {@code tests/target/benchmark/cold-run.txt}.
     *
     * @param arguments the number of runs of each contender, if another than 7 is wanted
     */
    public static void main(String[] arguments) throws IOException, InterruptedException {
        int runs = arguments.length == 0 ? DEFAULT_RUNS : Integer.parseInt(arguments[0]);
        Path folder = Clone.root().resolve("tests/target/benchmark");
        String heading = String.format(
                "Java %s on %s %s, %d processors; medians of %d alternating runs",
                System.getProperty("java.version"),
                System.getProperty("os.name"),
                System.getProperty("os.arch"),
                Runtime.getRuntime().availableProcessors(),
                runs);
        String table = Figure.table(heading, measure(runs, new Workload(9), new Workload(125), folder));
        Files.writeString(folder.resolve("cold-run.txt"), table);
        System.out.print(table);
    }

    /**
     * Measures all figures.
     *
     * @param runs how often each contender runs, at least once
     * @param usual the sheet of usual size
     * @param large the sheet it is compared with
     * @param folder where the contenders' files go
     */
    static List<Figure> measure(int runs, Workload usual, Workload large, Path folder)
            throws IOException, InterruptedException {
        return new ColdRunBenchmark(runs, folder).measure(usual, large);
    }

    private List<Figure> measure(Workload usual, Workload large) throws IOException, InterruptedException {
        String size = usual.cells() + " cells, " + usual.javaLines() + " Java lines";
        Contender sheet = sill.run("a  sill run: " + size, "usual.sill", usual.worksheet());
        Contender launcher = launcher("b  source launcher: the same Java", usual.sourceFile());
        Contender prompt = prompt("c  snippet prompt, default engine: the same Java", usual.promptInput());
        Contender plots =
                sill.run("d  sill run: the sheet of a and two plots", "plots.sill", usual.worksheetWithTwoPlots());
        Contender longer = sill.run(
                "e  sill run: " + large.cells() + " cells, " + large.javaLines() + " Java lines",
                "large.sill",
                large.worksheet());
        sill.makeArchives();
        Map<String, List<Double>> times = new TreeMap<>();
        for (int run = runs == 1 ? 1 : 0; run <= runs; run++) {
            String launcherSaid = "";
            for (Contender contender : List.of(sheet, launcher, prompt, plots, longer)) {
                Contender.Run result = contender.run();
                if (contender == launcher) {
                    launcherSaid = result.out();
                } else if (contender == prompt && !withoutPrompts(result.out()).equals(launcherSaid.strip())) {
                    throw new IllegalStateException(
                            "the prompt computed otherwise than the launcher:\n" + result.out());
                }
                if (run > 0) {
                    times.computeIfAbsent(contender.name(), name -> new ArrayList<>())
                            .add(result.milliseconds());
                }
            }
        }
        List<Figure> figures = new ArrayList<>();
        times.forEach((name, all) -> figures.add(new Figure(name, Median.of(all), "ms", Double.NaN)));
        double a = figures.get(0).value();
        double b = figures.get(1).value();
        figures.add(new Figure("a / b", a / b, "", 1.5));
        figures.add(new Figure("a / c", a / figures.get(2).value(), "", 0.1));
        figures.add(new Figure("d / b", figures.get(3).value() / b, "", 2.5));
        figures.add(new Figure("e / a", figures.get(4).value() / a, "", 4));
        addMemory(figures, sheet);
        return figures;
    }

    private void addMemory(List<Figure> figures, Contender sheet) throws IOException, InterruptedException {
        if (!PeakMemory.canBeMeasured()) {
            System.out.println("Peak memory is measured on Linux alone.");
            return;
        }
        List<Double> proportional = new ArrayList<>();
        List<Double> resident = new ArrayList<>();
        for (int run = 0; run < runs; run++) {
            PeakMemory peak = sheet.peakMemory();
            proportional.add(peak.proportional());
            resident.add(peak.resident());
        }
        figures.add(
                new Figure("a  peak memory of all processes, shared pages once", Median.of(proportional), "MiB", 400));
        figures.add(new Figure("a  the same, shared pages once for each", Median.of(resident), "MiB", Double.NaN));
    }

    private Contender launcher(String name, String text) throws IOException {
        Path source = Files.writeString(folder.resolve("Calculation.java"), text);
        return new Contender(name, List.of(tool("java"), "-cp", libraries(), source.toString()), none, javaHome);
    }

    private Contender prompt(String name, String text) throws IOException {
        Path input = Files.writeString(folder.resolve("prompt.txt"), text);
        return new Contender(name, List.of(tool("jshell"), "-s", "--class-path", libraries()), input, javaHome);
    }

    private String tool(String name) {
        return javaHome.resolve("bin").resolve(name).toString();
    }

    /** What worksheets are compiled against, from where the start script has it. */
    private static String libraries() throws IOException {
        try (Stream<Path> jars = Files.list(Clone.root().resolve("engine/target/lib"))) {
            return jars.map(Path::toString)
                    .filter(jar -> jar.contains("sill-stdlib") || jar.contains("commons-math"))
                    .sorted()
                    .collect(Collectors.joining(java.io.File.pathSeparator));
        }
    }

    private static String withoutPrompts(String said) {
        return said.replaceAll("(?m)^(-> *\\x08*)+", "").strip();
    }
}
