package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import sill.worksheet.Worksheet;

/** The same text gives the same reports, byte for byte, from one worker to the next. */
class SameBytesTest {
    /** Collections whose own order the JDK varies from process to process, an exception, and values without a text of their own. */
    private static final String SHEET = """
            sill 1
            title: T
            :: given G
            temps = [-10, 25] °C
            :: calc C
            enum Mode { ON, OFF, IDLE }
            record Key(String name, double[] values) {}
            Set<String> names = Set.of("a", "b", "c", "d", "e", "f", "g");
            Map<String, Integer> counts = Map.of("a", 1, "b", 2, "c", 3, "d", 4, "e", 5);
            Map<Mode, Double> modes = Map.of(Mode.ON, 1.0, Mode.OFF, 2.0, Mode.IDLE, 3.0);
            Set<Object> mixed = new HashSet<>(List.of(new Object(), "x", 1, Mode.ON));
            Map<Object, Integer> objects = new IdentityHashMap<>(Map.of(new StringBuilder("q"), 1, new StringBuilder("p"), 2));
            Set<Key> keys = Set.of(new Key("k", new double[] {2}), new Key("k", new double[] {1}));
            var grouped = Stream.of("x", "yy", "zz").collect(Collectors.groupingBy(String::length));
            Runnable lambda = () -> {};
            Plots.line("t", "x", "y", temps, temps)
            double s = sin(1) + pow(2, 0.3) + exp(0.1) + log(7);
            :: calc Cast
            Object o = new Key("a", temps);
            Runnable r = (Runnable) o;
            :: calc Deep
            int deep(int n) { return deep(n + 1); }
            deep(0)
            :: check R
            s at least 1
            """;

    @Test
    void reportsOfTwoWorkersAreEqual() throws IOException, InterruptedException {
        List<String> first = reports();

        assertThat(first).hasSizeGreaterThan(6);
        assertThat(reports()).isEqualTo(first);
    }

    private static List<String> reports() throws IOException, InterruptedException {
        Process worker = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Xss16m",
                        "-cp",
                        System.getProperty("java.class.path"),
                        WorkerMain.class.getName(),
                        WorksheetClassPath.text())
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        byte[] job = JobWriter.job(Worksheet.parse(SHEET), Map.of(), Set.of()).bytes();
        DataOutputStream out = new DataOutputStream(worker.getOutputStream());
        out.writeInt(job.length);
        out.write(job);
        out.flush();
        List<String> reports = new ArrayList<>();
        try (DataInputStream in = new DataInputStream(worker.getInputStream())) {
            while (true) {
                byte[] report = in.readNBytes(in.readInt());
                reports.add(new String(report, java.nio.charset.StandardCharsets.ISO_8859_1));
                if (Report.of(report) instanceof Report.Finished) {
                    return reports;
                }
            }
        } finally {
            worker.destroyForcibly().waitFor();
        }
    }
}
