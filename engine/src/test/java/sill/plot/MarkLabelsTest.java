package sill.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;

class MarkLabelsTest {
    @Property
    void noLabelAboveLiesOnAnother(
            @ForAll @Size(min = 2, max = 12) List<@DoubleRange(min = 40, max = 640) Double> lines) {
        List<MarkLabels.Flag> flags = MarkLabels.above(
                lines.stream()
                        .map(at -> new MarkLabels.Wanted(at, "trip point 3.300 V"))
                        .toList(),
                8,
                672);
        assertThat(flags).hasSameSizeAs(lines);
        for (MarkLabels.Flag a : flags) {
            assertThat(a.from()).isGreaterThanOrEqualTo(8);
            assertThat(a.to()).isLessThanOrEqualTo(672);
            assertThat(flags).noneMatch(b -> b != a && b.row() == a.row() && b.from() < a.to() && a.from() < b.to());
        }
    }

    @Property
    void noLabelBesideLiesOnAnother(
            @ForAll @Size(min = 2, max = 12) List<@DoubleRange(min = 50, max = 380) Double> lines) {
        double[] placed = MarkLabels.beside(
                lines.stream().mapToDouble(Double::doubleValue).toArray(), 50, 380);
        double[] sorted = placed.clone();
        Arrays.sort(sorted);
        for (int i = 1; i < sorted.length; i++) {
            assertThat(sorted[i] - sorted[i - 1]).isGreaterThan(MarkLabels.ROW - 1e-9);
        }
    }

    @Test
    void aLabelWithRoomStandsAtItsLine() {
        assertThat(MarkLabels.beside(new double[] {300, 100}, 50, 380)).containsExactly(300, 100);
        MarkLabels.Flag flag = MarkLabels.above(List.of(new MarkLabels.Wanted(100, "start")), 8, 672)
                .get(0);
        assertThat(flag.row()).isZero();
        assertThat(flag.from()).isEqualTo(104);
        assertThat(flag.leftwards()).isFalse();
    }
}
