package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sill.values.CellState;
import sill.values.Finding;
import sill.values.Finding.Trend;
import sill.values.RunResult;

/** Tolerance cells, from the worksheet's text to what they find. */
class StudyRunTest {
    private static final String DIVIDER = """
            sill 1
            title: T
            :: given G
            vIn = 10 V ± 5 %
            rTop = 3 kΩ ± 1 %
            rBottom = 2 kΩ ± 1 %
            rLoad = 1 MΩ
            part = "film"
            :: calc C
            double out = Dividers.output(vIn, rTop, rBottom); // [mV] tap
            TripPoints trip = new TripPoints(out, out / 2);
            """;

    private static RunResult run(String behind) {
        return Sheets.here(DIVIDER + behind);
    }

    private static Finding only(RunResult result) {
        assertThat(result.problems()).isEmpty();
        assertThat(result.findings()).hasSize(1);
        return result.findings().get(0);
    }

    /**
     * The output rises with the supply and the lower arm and falls with the upper one, so that the extremes are, by arithmetic,
     * {@code 9.5 V · 1980 / (1980 + 3030)} and {@code 10.5 V · 2020 / (2020 + 2970)}.
     */
    @Test
    void theExtremesOfADividerAreThoseOfIntervalReasoning() {
        Finding found = only(run(":: tolerance T\nof: out\nmethod: worst-case, rss\n"));

        assertThat(found.name()).isEqualTo("out");
        assertThat(found.unit()).isEqualTo("V");
        assertThat(found.shownIn()).isEqualTo("mV");
        assertThat(found.nominal()).isEqualTo(4);
        assertThat(found.varied()).containsExactly("vIn", "rTop", "rBottom");
        Finding.WorstCase extremes = found.worstCase().orElseThrow();
        assertThat(extremes.low().value()).isCloseTo(9.5 * 1980 / (1980 + 3030), within(1e-12));
        assertThat(extremes.high().value()).isCloseTo(10.5 * 2020 / (2020 + 2970), within(1e-12));
        assertThat(extremes.low().at()).containsExactly(9.5, 3030.0, 1980.0);
        assertThat(extremes.trends()).containsExactly(Trend.RISING, Trend.FALLING, Trend.RISING);
        assertThat(extremes.isMonotonic()).isTrue();
        // Slopes by calculus: out / vIn, −vIn · rBottom / (rTop + rBottom)², vIn · rTop / (rTop + rBottom)².
        double half = Math.sqrt(
                Math.pow(0.4 * 0.5, 2) + Math.pow(10 * 2000.0 / 25e6 * 30, 2) + Math.pow(10 * 3000.0 / 25e6 * 20, 2));
        assertThat(found.rootSumSquare().orElseThrow().high()).isCloseTo(4 + half, within(1e-8));
        assertThat(found.sensitivities().get(0).given()).isEqualTo("vIn");
        assertThat(found.sensitivities().get(0).slope()).isCloseTo(0.4, within(1e-9));
        assertThat(found.remarks()).isEmpty();
    }

    @Test
    void aRecordIsStudiedByComponent() {
        RunResult result = run(":: tolerance T\nof: trip, out * 2\nmethod: worst-case\n");

        assertThat(result.findings())
                .extracting(Finding::name)
                .containsExactly("trip.rising", "trip.falling", "out * 2");
        assertThat(result.findings()).extracting(Finding::index).containsExactly(1, 1, 2);
        assertThat(result.findings()).extracting(Finding::unit).containsExactly("V", "V", "V");
    }

    @Test
    void whatIsHeldStaysAndWhatIsNamedAloneVaries() {
        Finding held = only(run(":: tolerance T\nof: out\nmethod: worst-case\nhold: vIn\n"));
        assertThat(held.varied()).containsExactly("rTop", "rBottom");
        Finding alone = only(run(":: tolerance T\nof: out\nmethod: worst-case\nvary: vIn\n"));
        assertThat(alone.worstCase().orElseThrow().high().value()).isCloseTo(4.2, within(1e-12));
    }

    @Test
    void alongAGiven() {
        Finding.Sweep sweep = only(run(":: tolerance T\nof: out\nmethod: worst-case\nover: vIn\n"))
                .sweep()
                .orElseThrow();

        assertThat(sweep.given()).isEqualTo("vIn");
        assertThat(sweep.at()).hasSize(41).startsWith(9.5).endsWith(10.5);
        assertThat(sweep.nominal().get(0)).isCloseTo(3.8, within(1e-12));
        assertThat(sweep.high().get(40)).isCloseTo(10.5 * 2020 / (2020 + 2970), within(1e-12));
        assertThat(sweep.low().get(40)).isCloseTo(10.5 * 1980 / (1980 + 3030), within(1e-12));
    }

    /** A uniform spread of ±5 % about 10 V has the standard deviation 0.5 V / √3 and 95 % of it within ±0.475 V. */
    @Test
    void samplesOfAUniformGiven() {
        RunResult result =
                run(":: calc D\ndouble same = vIn;\n:: tolerance T\nof: same\nmethod: monte-carlo 100000 seed 7\n"
                        + ":: check K\nsame within 9.525 V .. 10.475 V in 90 %\n");
        Finding.MonteCarlo sampled = only(result).monteCarlo().orElseThrow();

        assertThat(sampled.mean()).isCloseTo(10, within(4 * 0.5 / Math.sqrt(3) / Math.sqrt(100_000)));
        assertThat(sampled.sd()).isCloseTo(0.5 / Math.sqrt(3), within(0.002));
        assertThat(sampled.high() - sampled.low()).isCloseTo(0.95, within(0.005));
        assertThat(sampled.quantiles().keySet()).containsExactly("0.00135", "0.025", "0.5", "0.975", "0.99865");
        assertThat(sampled.notFinite()).isZero();
        assertThat(sampled.shares()).hasSize(1);
        assertThat(sampled.shares().get(0).line()).isEqualTo(18);
        assertThat(sampled.shares().get(0).share()).isCloseTo(0.95, within(0.004));
        assertThat(sampled.shares().get(0).low())
                .isLessThan(sampled.shares().get(0).share());
    }

    @Test
    void samplesThatThrowAreCounted() {
        RunResult result = run("""
                :: calc D
                double vMost = 10.25; // [V] stated
                double picky(double v) {
                    if (v > vMost) {
                        throw new IllegalStateException("too high");
                    }
                    return v;
                }
                double checked = picky(vIn);
                :: tolerance T
                of: checked
                method: monte-carlo 4000 seed 1
                """);
        Finding found = result.findings().get(0);
        Finding.MonteCarlo sampled = found.monteCarlo().orElseThrow();

        assertThat(sampled.thrown()).isBetween(850L, 1150L).isEqualTo(sampled.notFinite());
        assertThat(sampled.max()).isLessThanOrEqualTo(10.25);
        assertThat(found.remarks())
                .containsExactly(
                        sampled.thrown()
                                + " of 4000 samples gave no finite value, the first java.lang.IllegalStateException: too high.");
        assertThat(result.problems())
                .extracting(problem ->
                        problem.line() + ":" + problem.column() + " " + problem.message() + " " + problem.hint())
                .containsExactly("22:1 Cell 4 'T', 'checked': found " + sampled.thrown()
                        + " of 4000 samples gave no finite value, the first java.lang.IllegalStateException: too high,"
                        + " expected one in every repetition Guard the calculation where it fails, or narrow the limits"
                        + " that lead there. The figures are those of the others.");
    }

    @Test
    void aPartChosenInTheSheetIsRemarkedOn() {
        Finding found =
                only(run(":: calc D\ndouble chosen = Series.E24.nearest(rTop * 1.1);\n:: tolerance T\nof: chosen\n"
                        + "method: worst-case\n"));

        assertThat(found.remarks())
                .containsExactly(
                        "A preferred part that the worksheet chooses is chosen anew in every repetition. Where it"
                                + " is to stay, state it as a given, with its tolerance.");
    }

    @Test
    void whatCannotBeStudied() {
        assertThat(problems(":: tolerance T\nof: part, out > vIn\nmethod: rss\n"))
                .containsExactly(
                        "13:1 Cell 3 'T': found a String in 'part', expected a finite number or a record of them",
                        "13:1 Cell 3 'T': found a boolean in 'out > vIn', expected a finite number or a record of them");
        assertThat(problems(":: tolerance T\nof: rLoad\nmethod: rss\n"))
                .containsExactly(
                        "12:1 Cell 3 'T': found no given to vary, expected one with limits on which the studied"
                                + " values rest");
        assertThat(problems("""
                :: calc D
                class Counter {
                    static int calls;
                    static double next(double x) { return x + calls++; }
                }
                double counted = Counter.next(vIn);
                :: tolerance T
                of: counted
                method: rss
                """))
                .containsExactly(
                        "18:1 Cell 4 'T': its calculation, repeated at the nominal values, does not give what the"
                                + " cells gave");
        assertThat(problems(":: tolerance T\nof: nothing\nmethod: rss\n"))
                .containsExactly("13:5 Cell 3 'T': found the variable 'nothing', expected one that is declared above");
    }

    private static List<String> problems(String behind) {
        RunResult result = run(behind);
        assertThat(result.findings()).isEmpty();
        assertThat(result.cells()).anyMatch(cell -> cell.state() == CellState.PROBLEM);
        return result.problems().stream()
                .map(problem -> problem.line() + ":" + problem.column() + " " + problem.message())
                .toList();
    }

    /** A cell that rests on one that did not end is not studied. */
    @Test
    void aStudyWaitsOnItsCells() {
        RunResult result =
                run(":: calc D\ndouble lost = 1 / (int) (vIn - 10);\n:: tolerance T\nof: lost\nmethod: rss\n");

        assertThat(result.cells())
                .extracting(cell -> cell.number() + " " + cell.state().word() + ": " + cell.reason())
                .contains("4 not run: waits on lost (cell 3)");
    }
}
