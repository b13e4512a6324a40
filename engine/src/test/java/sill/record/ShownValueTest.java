package sill.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import sill.values.Datum;
import sill.values.Result;

/** The expected texts follow the rules that {@code Notation} names: SI brochure, 9th edition, 5.4. */
class ShownValueTest {
    @Test
    void aListHasItsUnitOnce() {
        assertThat(shown("s", "min", 0, 120, 90).text()).isEqualTo("0, 2.000, 1.500\u00a0min");
    }

    @Test
    void aLongListIsCutAndSaysHowLongItIs() {
        assertThat(shown("V", "mV", 1, 2, 3, 4, 5, 6, 7).text())
                .isEqualTo("1000, 2000, 3000, 4000, 5000, 6000, …\u00a0mV (7 values)");
    }

    @Test
    void inFullAListHasEveryValueAndDigit() {
        assertThat(shown("V", "mV", 1, 2, 3, 4, 5, 6, 0.123456789).full())
                .isEqualTo("1000, 2000, 3000, 4000, 5000, 6000, 123.456789\u00a0mV");
    }

    @Test
    void celsiusValuesKeepTheirOffset() {
        assertThat(shown("K", "°C", 273.15, 298.15).text()).isEqualTo("0, 25.00\u00a0°C");
    }

    @Test
    void withoutAUnitOfTheCaptionEachNumberHasItsPrefix() {
        assertThat(shown("V", "", 0.5, 5).text()).isEqualTo("500.0\u00a0mV, 5.000\u00a0V");
    }

    @Test
    void rowsOfATableAreHeldTogether() {
        Datum grid = new Datum.Items(List.of(items(1, 2), items(3, 4)), 2);
        Datum points = new Datum.Items(List.of(new Datum.Fields(Map.of("r", new Datum.Real(1)))), 1);

        assertThat(shown("", "", grid).text()).isEqualTo("[1.000, 2.000], [3.000, 4.000]");
        assertThat(shown("", "", points).text()).isEqualTo("(r 1.000)");
    }

    private static Datum items(double... values) {
        List<Datum> items = Arrays.stream(values)
                .mapToObj(value -> (Datum) new Datum.Real(value))
                .toList();
        return new Datum.Items(items, items.size());
    }

    private static ShownValue shown(String unit, String shownIn, double... values) {
        return shown(unit, shownIn, items(values));
    }

    private static ShownValue shown(String unit, String shownIn, Datum value) {
        return ShownValue.of(new Result(
                "x",
                1,
                1,
                1,
                "",
                "double[]",
                value,
                Optional.empty(),
                unit,
                shownIn,
                Map.of(),
                "",
                List.of(),
                List.of(),
                Optional.empty()));
    }
}
