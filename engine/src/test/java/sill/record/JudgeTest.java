package sill.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.record.DesignRecord.CheckEntry;
import sill.values.CheckValue;
import sill.values.Datum;
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
}
