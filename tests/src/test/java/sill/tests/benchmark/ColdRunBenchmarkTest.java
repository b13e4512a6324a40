package sill.tests.benchmark;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** That the benchmark works, on small sheets; it judges no time. */
class ColdRunBenchmarkTest {
    @TempDir
    Path folder;

    @Test
    void theSheetOfTheAimHasItsSize() {
        Workload usual = new Workload(9);
        assertThat(usual.cells()).isEqualTo(12);
        assertThat(usual.javaLines()).isEqualTo(72);
        assertThat(usual.worksheet().lines().filter(line -> line.startsWith("::")))
                .hasSize(12);
        assertThat(new Workload(125).javaLines()).isEqualTo(1000);
    }

    @Test
    @EnabledOnOs(OS.LINUX)
    void everyRowIsMeasured() throws Exception {
        List<Figure> figures = ColdRunBenchmark.measure(1, new Workload(2), new Workload(10), folder);
        assertThat(figures)
                .extracting(Figure::name)
                .containsExactly(
                        "a  sill run: 5 cells, 16 Java lines",
                        "b  source launcher: the same Java",
                        "c  snippet prompt, default engine: the same Java",
                        "d  sill run: the sheet of a and two plots",
                        "e  sill run: 13 cells, 80 Java lines",
                        "a / b",
                        "a / c",
                        "d / b",
                        "e / a",
                        "a  peak memory of all processes, shared pages once",
                        "a  the same, shared pages once for each");
        assertThat(figures)
                .allSatisfy(figure -> assertThat(figure.value()).isFinite().isPositive());
    }

    @Test
    void aTableShowsEachFigureBesideItsAim() {
        List<Figure> figures = List.of(
                new Figure("a  a run", 532.4, "ms", Double.NaN),
                new Figure("a / b", 0.7312, "", 1.5),
                new Figure("b  rate", 0.94, "", 0.9, true),
                new Figure("c  rate", 0.84, "", 0.9, true),
                new Figure("a  memory", 412.6, "MiB", 400));
        assertThat(Figure.table("Heading", figures)).isEqualTo("""
                Heading
                a  a run        532 ms
                a / b         0.731       aim: at most 1.5 (reached)
                b  rate       0.940       aim: at least 0.9 (reached)
                c  rate       0.840       aim: at least 0.9 (MISSED)
                a  memory       413 MiB   aim: at most 400 (MISSED)
                """);
    }
}
