package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import sill.values.CellRun;
import sill.values.Datum;
import sill.values.Result;
import sill.values.RunResult;

/**
 * A worksheet's cells in a worker of their own: whatever a cell does to its process, there is a result, the cell is stopped, what
 * waits on it is not run, and everything else is. Limits are small where a cell runs into them and ample everywhere else.
 */
class SheetRunTest {
    private static final Limits SHORT = new Limits(Duration.ofSeconds(4), 128);

    /** Three cells around one that misbehaves: before it, resting on it, and after it. */
    private static String around(String java) {
        return "sill 1\ntitle: T\n:: calc Before\ndouble before = 1;\n:: calc Bad\n" + java
                + "\n:: calc Rests\ndouble rests = bad;\n:: calc After\ndouble after = before + 1;\n"
                + ":: check R\nafter at least 1\nbad at least 1\n";
    }

    private static void othersRan(RunResult run) {
        assertThat(values(run)).containsEntry("before", 1.0).containsEntry("after", 2.0);
        assertThat(states(run)).containsExactly("done", "stopped", "not run", "done");
        assertThat(run.cells().get(2).reason()).isEqualTo("waits on bad (cell 2)");
        assertThat(run.cells().get(2).waitsOn()).containsExactly("bad");
        assertThat(run.checks()).hasSize(1);
    }

    @Test
    void aLoopWithoutAnEndIsStopped() {
        RunResult run = Sheets.inWorker(around("double bad = 1;\nwhile (bad > 0) { bad++; }"), SHORT);

        othersRan(run);
        assertThat(problems(run))
                .containsExactly("5:1 cell 2: Cell 2 'Bad': stopped, it took longer than 4 s"
                        + " > Look for a loop without an end, or allow more with --time-limit.");
    }

    @Test
    void everyOtherStepThatNeverEndsIsStoppedToo() {
        RunResult run = Sheets.inWorker("""
                sill 1
                title: T
                :: calc Set-up
                class Slow { static final int K = spin(); static int spin() { while (true) { } } }
                int k = Slow.K;
                :: calc Shown
                class Shown { @Override public String toString() { while (true) { } } }
                Shown shown = new Shown();
                :: calc Fine
                int fine = 1;
                boolean spin() { while (true) { } }
                :: check R
                fine at least 1
                spin() holds
                fine at most 2
                """, new Limits(Duration.ofSeconds(2), 128));

        assertThat(states(run)).containsExactly("stopped", "stopped", "done");
        assertThat(run.checks()).hasSize(2);
        assertThat(problems(run))
                .containsExactly(
                        "3:1 cell 1: Cell 1 'Set-up': stopped, it took longer than 2 s"
                                + " > Look for a loop without an end, or allow more with --time-limit.",
                        "6:1 cell 2: Cell 2 'Shown': stopped, it took longer than 2 s"
                                + " > Look for a loop without an end, or allow more with --time-limit.",
                        "14:1 cell 4: Cell 4 'R': stopped, it took longer than 2 s"
                                + " > Look for a loop without an end, or allow more with --time-limit.");
    }

    /** That it tells how far it is gives it no more time. */
    @Test
    void aToleranceCellThatTakesTooLongIsStopped() {
        RunResult run = Sheets.inWorker("""
                sill 1
                title: T
                :: given G
                vIn = 5 V ± 1 %
                :: calc C
                double v = 2 * vIn;
                :: tolerance Long
                of: v
                method: monte-carlo 1000000000 seed 1
                :: tolerance Short
                of: v
                method: monte-carlo 1000 seed 1
                """, new Limits(Duration.ofSeconds(3), 256));

        assertThat(states(run)).containsExactly("done", "stopped", "done");
        assertThat(run.findings()).hasSize(1);
        assertThat(problems(run))
                .containsExactly("7:1 cell 3: Cell 3 'Long': stopped, it took longer than 3 s"
                        + " > Look for a loop without an end, or allow more with --time-limit.");
    }

    @Test
    void aCellThatTakesAllMemoryIsStopped() {
        RunResult run = Sheets.inWorker(
                around(
                        "List<double[]> bad0 = new ArrayList<>();\nwhile (true) { bad0.add(new double[1 << 20]); if (bad0.size() < 0) break; }\n"
                                + "double bad = 1;"),
                new Limits(Duration.ofSeconds(60), 64));

        othersRan(run);
        assertThat(problems(run))
                .containsExactly("5:1 cell 2: Cell 2 'Bad': stopped, it ran out of memory"
                        + " > Keep fewer values, or allow more with --memory.");
    }

    @Test
    void aCellThatEndsItsProcessIsStopped() {
        for (String end : List.of("System.exit(3);", "Runtime.getRuntime().halt(3);")) {
            RunResult run = Sheets.inWorker(around("double bad = 1;\n" + end), Sheets.AMPLE);

            othersRan(run);
            assertThat(problems(run))
                    .containsExactly("5:1 cell 2: Cell 2 'Bad': stopped, its worker ended with status 3"
                            + " > Leave out what ends the process, such as System.exit.");
        }
    }

    @Test
    void aCellThatWritesAmongTheReportsIsStopped() {
        RunResult run = Sheets.inWorker(
                around("double bad = 1;\ntry (var out = new java.io.FileOutputStream(java.io.FileDescriptor.out)) {\n"
                        + "    out.write(new byte[] {127, 127, 127, 127, 1, 2, 3});\n}\nThread.sleep(60_000);"),
                Sheets.AMPLE);

        othersRan(run);
        assertThat(problems(run))
                .containsExactly(
                        "5:1 cell 2: Cell 2 'Bad': stopped, its worker sent what is no report: message of 2139062143 bytes"
                                + " > Leave the process's own output alone.");
    }

    @Test
    void aWorkerKilledFromOutsideCostsTheCellItWasAt() {
        List<Integer> begun = new ArrayList<>();
        Progress killing = cell -> {
            begun.add(cell);
            if (cell == 2) {
                ProcessHandle.current()
                        .children()
                        .filter(SheetRunTest::isWorker)
                        .forEach(ProcessHandle::destroyForcibly);
            }
        };
        RunResult run =
                Sheets.inWorker(around("double bad = 1;\nThread.sleep(60_000);"), Map.of(), Sheets.AMPLE, killing);

        othersRan(run);
        assertThat(begun).containsExactly(0, 1, 2, 0, 1, 4, 5);
        assertThat(problems(run))
                .containsExactly("5:1 cell 2: Cell 2 'Bad': stopped, its worker ended with status 137"
                        + " > Something outside ended the process. Run again.");
    }

    @Test
    void aWorkerKilledWheneverItStartsIsNotStartedForEver() {
        Progress killing = cell -> ProcessHandle.current()
                .children()
                .filter(SheetRunTest::isWorker)
                .forEach(ProcessHandle::destroyForcibly);
        RunResult run = Sheets.inWorker(around("double bad = 1;"), Map.of(), Sheets.AMPLE, killing);

        assertThat(states(run)).containsOnly("stopped").hasSize(4);
        assertThat(run.results()).isEmpty();
        assertThat(problems(run))
                .containsExactly("1:1 cell 0: The worksheet's Java: stopped, its worker ended with status 137"
                        + " > Something outside ended the process. Run again.");
    }

    @Test
    void whatACellPrintsReadsAndLeavesBehindStaysInBounds() {
        RunResult run = Sheets.inWorker("""
                sill 1
                title: T
                :: calc Prints
                for (int i = 0; i < 3_000_000; i++) { System.out.print("x"); }
                :: calc Reads
                int read = System.in.read();
                :: calc Leaves threads
                Thread spins = new Thread(() -> { while (true) { Thread.onSpinWait(); } });
                spins.start();
                :: calc Is large
                double[] large = new double[250_000];
                List<String> texts = Collections.nCopies(3, "y".repeat(30_000));
                :: calc Is deep
                Object deep = 1;
                for (int i = 0; i < 100_000; i++) { deep = List.of(deep); }
                int depth(int n) { return n == 0 ? 0 : 1 + depth(n - 1); }
                depth(10_000)
                """, Sheets.AMPLE);

        assertThat(run.problems()).isEmpty();
        assertThat(states(run)).containsOnly("done").hasSize(5);
        assertThat(run.cells().get(0).output())
                .isEqualTo("x".repeat(65_536) + "\n… 2934464 more bytes were printed and are not kept\n");
        assertThat(value(run, "read")).isEqualTo(new Datum.Whole("-1"));
        Datum.Items large = (Datum.Items) value(run, "large");
        assertThat(large.size()).isEqualTo(250_000);
        assertThat(large.items()).hasSize(200_000);
        assertThat(((Datum.Items) value(run, "texts")).items()).containsOnly(new Datum.Text("y".repeat(20_000) + "…"));
        assertThat(run.results())
                .last()
                .satisfies(last -> assertThat(last.value()).isEqualTo(new Datum.Whole("10000")));
    }

    @Test
    void theWorkerSeesNeitherTheEnvironmentNorTheEngine() {
        RunResult run = Sheets.inWorker("""
                sill 1
                title: T
                :: calc One
                int variables = System.getenv().size();
                String zone = TimeZone.getDefault().getID();
                String locale = Locale.getDefault().toString();
                String line = System.lineSeparator();
                :: calc Two
                Class.forName("sill.worker.SheetRun")
                :: calc Three
                sill.worksheet.Worksheet w = null;
                """, Sheets.AMPLE);

        assertThat(value(run, "variables")).isEqualTo(new Datum.Whole("0"));
        assertThat(value(run, "zone")).isEqualTo(new Datum.Text("UTC"));
        assertThat(value(run, "locale")).isEqualTo(new Datum.Text("en"));
        assertThat(value(run, "line")).isEqualTo(new Datum.Text("\n"));
        assertThat(problems(run))
                .containsExactly(
                        "9:7 cell 2: Cell 2 'Two': ended in ClassNotFoundException: sill.worker.SheetRun",
                        "11:15 cell 3: Cell 3 'Three': package sill.worksheet does not exist");
    }

    @Test
    void dataFilesAreTablesOrSayWhyNot() {
        RunResult run = Sheets.inWorker(
                """
                sill 1
                title: T
                :: given Data
                good = file "good.csv"
                ragged = file "ragged.csv"
                gone = file "gone.csv"
                :: calc One
                double top = Arrays.stream(good.column("v")).max().getAsDouble();
                :: calc Two
                double rows = ragged.rows();
                :: calc Three
                double none = gone.rows();
                """,
                Map.of("good.csv", bytes("v [mV]\n1\n20\n"), "ragged.csv", bytes("a,b\n1\n")),
                Sheets.AMPLE,
                Progress.SILENT);

        assertThat(values(run)).isEqualTo(Map.of("top", 0.02));
        assertThat(run.cells().stream().map(CellRun::reason))
                .containsExactly("", "waits on ragged (cell 1)", "waits on gone (cell 1)");
        assertThat(problems(run))
                .containsExactly("5:1 cell 1: Data file of 'ragged': line 2: found 1 field, expected 2 as in the header"
                        + " > Give comma separated text in UTF-8, a header line first, numbers with a decimal point.");
    }

    private static boolean isWorker(ProcessHandle process) {
        return process.info()
                .arguments()
                .map(arguments -> List.of(arguments).contains(WorkerMain.class.getName()))
                .orElse(false);
    }

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    private static List<String> states(RunResult run) {
        return run.cells().stream().map(cell -> cell.state().word()).toList();
    }

    private static Datum value(RunResult run, String name) {
        return run.results().stream()
                .filter(result -> result.name().equals(name))
                .findFirst()
                .orElseThrow()
                .value();
    }

    private static Map<String, Double> values(RunResult run) {
        return run.results().stream()
                .filter(result -> result.value() instanceof Datum.Real)
                .collect(Collectors.toMap(Result::name, result -> ((Datum.Real) result.value()).value()));
    }

    private static List<String> problems(RunResult run) {
        return run.problems().stream()
                .map(problem -> problem.line() + ":" + problem.column() + " cell " + problem.cell() + ": "
                        + problem.message() + (problem.hint().isEmpty() ? "" : " > " + problem.hint()))
                .toList();
    }
}
