package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class RootSumSquareTest {
    private static final Published PUBLISHED = new Published("limit-sums.tsv");

    private static void compare(String of, Findings found) {
        RootSumSquare rss = found.rss().orElseThrow();
        WorstCase worst = found.worstCase().orElseThrow();
        PUBLISHED.compare(of, "nominal", found.nominal(), 0);
        PUBLISHED.compare(of, "rss", rss.high() - found.nominal(), 0);
        PUBLISHED.compare(of, "rss", found.nominal() - rss.low(), 0);
        PUBLISHED.compare(of, "lowest", worst.low().value() - found.nominal(), 0);
        PUBLISHED.compare(of, "highest", worst.high().value() - found.nominal(), 0);
        assertThat(rss.doubts()).isEmpty();
    }

    @Test
    void aBrakesPower() {
        compare(
                "power",
                new Trial()
                        .uniform("turns", 1202, 1201, 1203)
                        .uniform("force", 45, 44.82, 45.18)
                        .uniform("arm", 0.397, 0.39573, 0.39827)
                        .uniform("time", 60, 59.5, 60.5)
                        .rss()
                        .worstCase()
                        .of((in, out) -> out[0] = 2 * Math.PI * in[0] * in[1] * in[2] / in[3]));
    }

    @Test
    void aDivider() {
        Findings found = new Trial()
                .uniform("top", 1e4, 9.9e3, 1.01e4)
                .uniform("bottom", 1e4, 9.9e3, 1.01e4)
                .rss()
                .worstCase()
                .of((in, out) -> out[0] = 5 * in[1] / (in[0] + in[1]));
        compare("divider", found);
        PUBLISHED.compare(
                "divider", "standard uncertainty", found.rss().orElseThrow().standardUncertainty(), 0);
    }

    /** By hand: y = 3 a − 2 b; upwards a moves by 3 × 0.1 and b by 2 × 0.2, downwards by 3 × 0.4 and 2 × 0.05. */
    @Test
    void eachSideTakesTheLimitThatMovesTheResultThere() {
        Findings found = new Trial()
                .uniform("a", 1, 0.6, 1.1)
                .triangular("b", 2, 1.8, 2.05)
                .rss()
                .of((in, out) -> out[0] = 3 * in[0] - 2 * in[1]);
        RootSumSquare rss = found.rss().orElseThrow();
        assertThat(rss.high()).isCloseTo(-1 + Math.sqrt(0.09 + 0.16), within(1e-12));
        assertThat(rss.low()).isCloseTo(-1 - Math.sqrt(1.44 + 0.01), within(1e-12));
        double ofB = 4 * (0.2 * 0.2 + 0.05 * 0.05 + 0.2 * 0.05) / 18;
        assertThat(rss.standardUncertainty()).isCloseTo(Math.sqrt(9 * 0.25 / 12 + ofB), within(1e-12));
        assertThat(found.sensitivities()).extracting(Sensitivity::given).containsExactly("a", "b");
        assertThat(found.sensitivities()).extracting(Sensitivity::slope).satisfies(slopes -> {
            assertThat(slopes.get(0)).isCloseTo(3, within(1e-12));
            assertThat(slopes.get(1)).isCloseTo(-2, within(1e-12));
        });
        assertThat(rss.linearPicturePoor()).isFalse();
    }

    @Test
    void aNominalValueAtALimitHasASlopeFromOneSide() {
        Findings found = new Trial()
                .uniform("a", 1, 1, 3)
                .uniform("b", 2, 1, 2)
                .of((in, out) -> out[0] = StrictMath.exp(in[0]) * in[1]);
        assertThat(found.sensitivities()).extracting(Sensitivity::given).containsExactly("a", "b");
        assertThat(found.sensitivities().get(0).slope()).isCloseTo(2 * Math.E, within(1e-8));
        assertThat(found.sensitivities().get(1).slope()).isCloseTo(Math.E, within(1e-11));
    }

    @Test
    void slopesOfSmoothFunctionsAreGoodToTenDigits() {
        Findings found = new Trial()
                .uniform("x", 1, 0.5, 1.5)
                .of((in, out) -> out[0] = StrictMath.sin(3 * in[0]) * StrictMath.exp(-in[0]));
        double slope = (3 * StrictMath.cos(3) - StrictMath.sin(3)) / Math.E;
        assertThat(found.sensitivities().get(0).slope()).isCloseTo(slope, within(1e-10));
    }

    @Test
    void aBentResultIsSaidToBe() {
        RootSumSquare rss = new Trial()
                .uniform("x", 0, -1, 1)
                .uniform("z", 0, -1, 2)
                .rss()
                .of((in, out) -> out[0] = in[0] * in[0] * 5 + in[1])
                .rss()
                .orElseThrow();
        assertThat(rss.doubts())
                .extracting(Doubt::words)
                .containsExactly(
                        "a straight line misses the result with x alone at its lower limit",
                        "a straight line misses the result with x alone at its upper limit",
                        "straight lines miss the highest result found");
        assertThat(rss.doubts().get(2).linear()).isCloseTo(2, within(1e-12));
        assertThat(rss.doubts().get(2).found()).isCloseTo(7, within(1e-12));
    }

    @Test
    void aSlopeThatIsNotThereIsSaidNotToBe() {
        Findings found = new Trial().uniform("x", 0, -1, 1).rss().of((in, out) -> out[0] = in[0] == 0 ? 1 : Double.NaN);
        assertThat(found.sensitivities().get(0).slope()).isNaN();
        assertThat(found.rss().orElseThrow().doubts().get(0).words()).isEqualTo("there is no finite slope with x");
    }
}
