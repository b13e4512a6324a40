package sill.tests.benchmark;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import sill.study.Sampling;
import sill.study.Setting;
import sill.study.Statistics;
import sill.study.WorstCase;

/** That the benchmark of tolerance runs works, on few samples, and that its contenders find the same; it judges no time. */
class StudyBenchmarkTest {
    private static final int SAMPLES = 200_000;

    @TempDir
    Path folder;

    @Test
    @EnabledOnOs(OS.LINUX)
    void everyRowIsMeasured() throws Exception {
        List<Figure> figures =
                StudyBenchmark.measure(new StudyBenchmark.Extent(1, 1, 0, 5000, 2000, 3000, 2000), folder);
        assertThat(figures)
                .extracting(Figure::name)
                .containsExactly(
                        "a  sheet's Java, one thread: 5000 samples, processor time",
                        "b  hand-written loop, keeping and sorting: 5000 samples, processor time",
                        "c  hand-written loop, adding alone: 5000 samples, processor time",
                        "rate of a / rate of b",
                        "rate of a / rate of b, by time passed",
                        "rate of a / rate of c",
                        "d  sheet's Java, one thread: time passed",
                        "e  sheet's Java, two threads: time passed",
                        "rate of e / rate of d",
                        "rate of two hand-written loops at once / of one",
                        "the former as a share of the latter",
                        "processor time of e / of d",
                        "processors that e had",
                        "f  sheet's Java, worst case of 16 givens: processor time",
                        "g  hand-written loop over the 2^16 corners: processor time",
                        "f / g",
                        "h  peak memory, a JVM with the study alone: 2000 samples",
                        "i  the same, 5000 samples",
                        "j  the same, 3000 samples",
                        "j / h",
                        "j / i",
                        "k  peak memory, all processes of sill run: 2000 samples",
                        "l  the same, 3000 samples",
                        "l / k",
                        "m  sill run: 72 Java lines",
                        "n  the same and 2000 samples of three results",
                        "o  the same, worst case and root sum square too",
                        "(n - m) / m",
                        "(o - m) / m");
        assertThat(figures).allSatisfy(figure -> {
            assertThat(figure.value()).isFinite();
            // What is added may be less than what disturbs it.
            assertThat(figure.value() > 0 || figure.name().contains("- m)")).isTrue();
        });
    }

    /** Within six of their sampling errors, for the two have other draws. */
    @Test
    void theHandWrittenLoopFindsWhatTheSheetFinds() throws Exception {
        SheetStudy study = SheetStudy.of(StudySheet.tripPoints(), folder);
        double[][] byHand = HandWritten.tripPoints(SAMPLES, 3);
        double[] means = HandWritten.tripPointSums(SAMPLES, 3);
        for (int k = 0; k < byHand.length; k++) {
            Statistics found = study.run(Optional.of(new Sampling(SAMPLES, 7)), 1)
                    .get(k)
                    .monteCarlo()
                    .orElseThrow()
                    .statistics()
                    .orElseThrow();
            assertThat(byHand[k][0])
                    .isCloseTo(found.mean().value(), within(6 * found.mean().standardError()));
            assertThat(means[k]).isCloseTo(byHand[k][0], within(1e-9));
            assertThat(byHand[k][1])
                    .isCloseTo(found.sd().value(), within(6 * found.sd().standardError()));
            for (int i = 0; i < found.quantiles().size(); i++) {
                assertThat(byHand[k][4 + i])
                        .isCloseTo(
                                found.quantiles().get(i).estimate().value(),
                                within(6 * found.quantiles().get(i).estimate().standardError()));
            }
        }
    }

    @Test
    void theHandWrittenCornersAreThoseOfTheSheet() throws Exception {
        StudySheet sheet = StudySheet.dividers();
        WorstCase found = SheetStudy.of(sheet, folder)
                .run(Optional.empty(), 1)
                .get(0)
                .worstCase()
                .orElseThrow();
        double[] byHand = HandWritten.dividerCorners(sheet.lows(), sheet.highs());
        assertThat(byHand[0]).isCloseTo(found.low().value(), within(1e-12));
        assertThat(byHand[1]).isCloseTo(found.high().value(), within(1e-12));
        assertThat(byHand[2]).isEqualTo(corner(found.low().at()));
        assertThat(byHand[3]).isEqualTo(corner(found.high().at()));
    }

    private static int corner(List<Setting> settings) {
        int corner = 0;
        for (int i = 0; i < settings.size(); i++) {
            corner |= settings.get(i).place() == Setting.Place.HIGH ? 1 << i : 0;
        }
        return corner;
    }
}
