package sill.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.assertj.core.data.Offset;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.record.DesignRecord.CheckEntry;
import sill.values.CheckValue;
import sill.values.Datum;
import sill.values.Finding;
import sill.values.RunResult;
import sill.worksheet.Worksheet;

/** Verdicts and margins; the expected ones are worked by hand from the rule that stands in {@link Window}. */
class JudgeTest {
    private static CheckEntry judged(String requirement, Optional<Datum> value, Map<Integer, String> withoutValue) {
        Worksheet worksheet = Worksheet.parse("sill 1\ntitle: T\n:: check C\nx " + requirement);
        assertThat(worksheet.problems()).isEmpty();
        List<CheckValue> values = value.map(found -> new CheckValue(4, found, "", List.of(), List.of())).stream()
                .toList();
        return Judge.judge(worksheet, new RunResult(List.of(), List.of(), values, withoutValue, List.of(), List.of()))
                .get(0);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            within 4 V .. 6 V      | 4.5   | holds | +500.0 mV   | 0.5    | 4 V .. 6 V
            within 4 V .. 6 V      | 6     | holds | 0 V         | 0      | 4 V .. 6 V
            within 4 V .. 6 V      | 6.5   | fails | −500.0 mV   | -0.5   | 4 V .. 6 V
            at least 300 mV        | 0.45  | holds | +150.0 mV   | 0.5    | ≥ 300 mV
            at most 2 kΩ           | 2500  | fails | −500.0 Ω    | -0.25  | ≤ 2 kΩ
            at least 0 V           | 0.2   | holds | +200.0 mV   |        | ≥ 0 V
            equals 5 V ± 0.2 V     | 4.9   | holds | +100.0 mV   | 0.5    | = 5 V ± 0.2 V
            equals 5 V ± 2 µV      | 5.1   | fails | −100.0 mV   | -49999 | = 5 V ± 2 µV
            equals 5 V ± 2.5 µV    | 5     | holds | +2.500 µV   | 1      | = 5 V ± 2.5 µV
            at most 40 °C          | 303.15| holds | +10.00 K    |        | ≤ 40 °C
            at least 1             | NaN   | fails | not a number|        | ≥ 1
            """)
    void aValueAgainstItsLimits(
            String requirement, double value, String verdict, String margin, Double share, String limit) {
        CheckEntry entry = judged(requirement, Optional.of(new Datum.Real(value)), Map.of());
        assertThat(entry.verdict().word()).isEqualTo(verdict);
        assertThat(entry.shownMargin().replace('\u00a0', ' ')).isEqualTo(margin);
        assertThat(entry.shownLimit().replace('\u00a0', ' ')).isEqualTo(limit);
        if (share != null) {
            assertThat(entry.marginShare().orElseThrow()).isCloseTo(share, Percentage.withPercentage(1e-6));
        }
    }

    @Test
    void aConditionHasNoMargin() {
        CheckEntry entry = judged("holds", Optional.of(new Datum.Truth(false)), Map.of());
        assertThat(entry.verdict()).isEqualTo(DesignRecord.Verdict.FAILS);
        assertThat(entry.margin()).isEmpty();
    }

    @Test
    void aCheckWithoutAValueSaysWhatItWaitsOn() {
        CheckEntry entry = judged("at least 1 V", Optional.empty(), Map.of(4, "waits on trip (cell 2)"));
        assertThat(entry.verdict()).isEqualTo(DesignRecord.Verdict.NOT_JUDGED);
        assertThat(entry.reason()).isEqualTo("waits on trip (cell 2)");
    }

    /** A finding of {@code x} over tolerance, in V. */
    private static Finding finding(double low, double high, Finding.Share share) {
        Finding.Extreme lowest = new Finding.Extreme(low, List.of(1.0));
        Finding.Extreme highest = new Finding.Extreme(high, List.of(2.0));
        return new Finding(
                1,
                1,
                "x",
                "",
                "V",
                "",
                5,
                List.of("r"),
                Optional.of(new Finding.WorstCase(lowest, highest, List.of(Finding.Trend.RISING))),
                Optional.empty(),
                Optional.of(new Finding.MonteCarlo(
                        1000,
                        7,
                        5,
                        1,
                        4,
                        6,
                        Map.of("0.5", 5.0),
                        Map.of(),
                        0,
                        4,
                        6,
                        0,
                        0,
                        new Finding.Histogram(4, 6, List.of(500L, 500L)),
                        List.of(share))),
                List.of(),
                Optional.empty(),
                List.of());
    }

    private static CheckEntry studied(String requirement, Finding finding) {
        Worksheet worksheet =
                Worksheet.parse("sill 1\ntitle: T\n:: tolerance S\nof: x\nmethod: worst-case, monte-carlo 1000"
                        + " seed 7\n:: check C\nx " + requirement);
        assertThat(worksheet.problems()).isEmpty();
        CheckValue value = new CheckValue(7, new Datum.Real(5), "", List.of(), List.of());
        return Judge.judge(
                        worksheet,
                        new RunResult(List.of(), List.of(), List.of(value), Map.of(), List.of(finding), List.of()))
                .get(0);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            within 4 V .. 6 V at worst-case   | 4.2 | 5.9 | holds | 0.1  | 4.200 V .. 5.900 V | +100.0 mV
            within 4 V .. 6 V at worst-case   | 3.5 | 5.9 | fails | -0.5 | 3.500 V .. 5.900 V | −500.0 mV
            at least 4 V at worst-case        | 4   | 9   | holds | 0    | 4.000 V .. 9.000 V | 0 V
            at most 6 V at worst-case         | 4   | 6.5 | fails | -0.5 | 4.000 V .. 6.500 V | −500.0 mV
            """)
    void atWorstCaseTheWorseExtremeCounts(
            String requirement, double low, double high, String verdict, double margin, String value, String shown) {
        CheckEntry entry = studied(requirement, finding(low, high, new Finding.Share(7, 1, 1)));
        assertThat(entry.verdict().word()).isEqualTo(verdict);
        assertThat(entry.margin().orElseThrow()).isCloseTo(margin, Offset.offset(1e-12));
        assertThat(entry.shownValue().replace('\u00a0', ' ')).isEqualTo(value);
        assertThat(entry.shownMargin().replace('\u00a0', ' ')).isEqualTo(shown);
        assertThat(entry.overTolerance().worst().orElseThrow().low().value()).isEqualTo(low);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0.999   | 0.99701 | holds | 99.9 % inside, at least 99.701 %   | +0.001 %
            0.999   | 0.99699 | fails | 99.9 % inside, at least 99.699 %   | −0.001 %
            1       | 0.997   | holds | 100 % inside, at least 99.7 %      | 0 %
            """)
    void ofAShareTheConfidenceBoundCounts(double share, double bound, String verdict, String value, String margin) {
        CheckEntry entry = studied("within 4 V .. 6 V in 99.7 %", finding(4, 6, new Finding.Share(7, share, bound)));
        assertThat(entry.verdict().word()).isEqualTo(verdict);
        assertThat(entry.shownValue().replace('\u00a0', ' ')).isEqualTo(value);
        assertThat(entry.shownMargin().replace('\u00a0', ' ')).isEqualTo(margin);
        assertThat(entry.shownLimit().replace('\u00a0', ' ')).isEqualTo("4 V .. 6 V in 99.7 %");
        assertThat(entry.margin()).contains(1.0);
    }

    @Test
    void aStudyThatFoundNothingLeavesItsChecksOpen() {
        Worksheet worksheet = Worksheet.parse(
                "sill 1\ntitle: T\n:: tolerance S\nof: x\nmethod: worst-case\n:: check C\nx at least 1 V at worst-case");
        CheckValue value = new CheckValue(7, new Datum.Real(5), "", List.of(), List.of());
        CheckEntry entry = Judge.judge(
                        worksheet, new RunResult(List.of(), List.of(), List.of(value), Map.of(), List.of(), List.of()))
                .get(0);
        assertThat(entry.verdict()).isEqualTo(DesignRecord.Verdict.NOT_JUDGED);
        assertThat(entry.reason()).isEqualTo("the tolerance cell that studies it found nothing: see the problems");
    }
}
