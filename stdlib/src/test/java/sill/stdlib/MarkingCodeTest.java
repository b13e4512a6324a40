package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class MarkingCodeTest {
    static List<PublishedTable.Row> codes() {
        return PublishedTable.read("iec60062.txt");
    }

    static List<PublishedTable.Row> e96() {
        return PublishedTable.read("iec60062-e96.txt");
    }

    static List<PublishedTable.Row> tolerances() {
        return PublishedTable.read("iec60062-tolerance.txt");
    }

    @ParameterizedTest
    @MethodSource("codes")
    void codeHasThePublishedValue(PublishedTable.Row row) {
        String code = row.get("code");
        double value = Double.parseDouble(row.get("value"));
        String shown = row.get("shown").isEmpty() ? code : row.get("shown");
        switch (row.get("kind")) {
            case "resistance" -> {
                assertThat(MarkingCode.parse(code)).isEqualTo(value);
                assertThat(MarkingCode.parseResistance(code)).isEqualTo(value);
                assertThat(MarkingCode.format(value)).isEqualTo(shown);
            }
            case "capacitance" -> {
                assertThat(MarkingCode.parse(code)).isEqualTo(value);
                assertThat(MarkingCode.parseCapacitance(code)).isEqualTo(value);
                assertThat(MarkingCode.formatCapacitance(value)).isEqualTo(shown);
            }
            case "resistance digits" ->
                assertThat(MarkingCode.parseResistance(code)).isEqualTo(value);
            case "capacitance digits" ->
                assertThat(MarkingCode.parseCapacitance(code)).isEqualTo(value);
            default -> throw new AssertionError(row + ": unknown kind");
        }
    }

    @ParameterizedTest
    @MethodSource("e96")
    void placeInE96HasThePublishedValue(PublishedTable.Row row) {
        assertThat(MarkingCode.parseResistance(row.get("code"))).isEqualTo(Double.parseDouble(row.get("value")));
    }

    @ParameterizedTest
    @MethodSource("tolerances")
    void toleranceLetterHasThePublishedValue(PublishedTable.Row row) {
        Figures.assertRelative(
                row.toString(),
                Double.parseDouble(row.get("percent")) / 100,
                MarkingCode.tolerance(row.get("letter")),
                1e-15);
    }

    @Test
    void theFilesAreWhole() {
        assertThat(codes()).hasSizeGreaterThan(35);
        assertThat(e96()).hasSize(96 + 9);
        assertThat(tolerances()).hasSize(14);
    }

    @Property(seed = "60062")
    void aResistanceSurvivesTheRoundTrip(
            @ForAll @IntRange(min = 1, max = 9999) int digits, @ForAll @IntRange(min = -6, max = 11) int power) {
        double resistance = Double.parseDouble(digits + "e" + power);
        assertThat(MarkingCode.parse(MarkingCode.format(resistance))).isEqualTo(resistance);
        assertThat(MarkingCode.parseResistance(MarkingCode.format(resistance))).isEqualTo(resistance);
    }

    @Property(seed = "60062")
    void aCapacitanceSurvivesTheRoundTrip(
            @ForAll @IntRange(min = 1, max = 9999) int digits, @ForAll @IntRange(min = -15, max = -2) int power) {
        double capacitance = Double.parseDouble(digits + "e" + power);
        assertThat(MarkingCode.parse(MarkingCode.formatCapacitance(capacitance)))
                .isEqualTo(capacitance);
        assertThat(MarkingCode.parseCapacitance(MarkingCode.formatCapacitance(capacitance)))
                .isEqualTo(capacitance);
    }

    @Test
    void aComputedValueCloseToAShortOneIsThat() {
        assertThat(MarkingCode.format(4700.000000001)).isEqualTo("4K7");
        assertThat(MarkingCode.format(999.9999999999)).isEqualTo("1K0");
        assertThat(MarkingCode.formatCapacitance(0.1e-12)).isEqualTo("p10");
    }
}
