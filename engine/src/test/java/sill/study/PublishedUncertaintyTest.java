package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.units.PublishedTable;

/** JCGM 100:2008 and JCGM 101:2008, and an NPL report. Correlated inputs are mixed from independent ones in the model. */
class PublishedUncertaintyTest {
    private static final Published PUBLISHED = new Published("uncertainty.tsv");
    private static final Model SUM = (in, out) -> out[0] = in[0] + in[1] + in[2] + in[3];

    private static Trial trial() {
        return new Trial().rss().samples(1_000_000, 101);
    }

    @Test
    void fourNormalInputs() {
        Findings found = trial().normal("x1", 0, 1)
                .normal("x2", 0, 1)
                .normal("x3", 0, 1)
                .normal("x4", 0, 1)
                .of(SUM);
        PUBLISHED.compare("9.2.2", found);
        assertThat(found.rss().orElseThrow().linearPicturePoor()).isFalse();
        assertThat(found.sensitivities())
                .extracting(Sensitivity::share)
                .allSatisfy(share -> assertThat(share).isCloseTo(0.25, within(1e-12)));
    }

    private static Trial rectangles(double fourth) {
        double a = Math.sqrt(3);
        return trial().uniform("x1", 0, -a, a)
                .uniform("x2", 0, -a, a)
                .uniform("x3", 0, -a, a)
                .uniform("x4", 0, -a * fourth, a * fourth);
    }

    @Test
    void fourRectangularInputs() {
        PUBLISHED.compare("9.2.3", rectangles(1).of(SUM));
    }

    @Test
    void oneRectangularInputOutweighsTheOthers() {
        Findings found = rectangles(10).of(SUM);
        PUBLISHED.compare("9.2.4", found);
        assertThat(found.sensitivities().get(0).given()).isEqualTo("x4");
        assertThat(found.sensitivities().get(0).share()).isCloseTo(100 / 103.0, within(1e-12));
    }

    @Test
    void massCalibration() {
        Findings found = trial().normal("mR", 100_000, 0.05)
                .normal("dmR", 1.234, 0.02)
                .uniform("air", 1.2, 1.1, 1.3)
                .uniform("weight", 8000, 7000, 9000)
                .uniform("reference", 8000, 7950, 8050)
                .of((in, out) -> out[0] = (in[0] + in[1]) * (1 + (in[2] - 1.2) * (1 / in[3] - 1 / in[4])) - 100_000);
        PUBLISHED.compare("9.3", found);
        assertThat(found.rss().orElseThrow().doubts().get(0).words())
                .isEqualTo("straight lines miss what air and weight do together");
    }

    @ParameterizedTest
    @CsvSource({"0, 0.000", "0, 0.010", "0, 0.050", "0.9, 0.000", "0.9, 0.010", "0.9, 0.050"})
    void comparisonLoss(String correlation, String first) {
        double r = Double.parseDouble(correlation);
        double x1 = Double.parseDouble(first);
        Findings found = trial().normal("z1", 0, 1).normal("z2", 0, 1).of((in, out) -> {
            double a = x1 + 0.005 * in[0];
            double b = 0.005 * (r * in[0] + Math.sqrt(1 - r * r) * in[1]);
            out[0] = 1e6 * (a * a + b * b);
        });
        PUBLISHED.compare("9.4 r " + correlation + " x1 " + first, found);
        assertThat(found.rss().orElseThrow().linearPicturePoor()).isTrue();
    }

    /** Student's t by Bailey's way (1994) from two uniform inputs; curvilinear trapezoids as in JCGM 101 6.4.3.4. */
    @Test
    void gaugeBlock() {
        Trial trial = trial();
        for (String name : List.of("ls", "d", "d1", "d2")) {
            trial.uniform(name + "u", 0.5, 0, 1).uniform(name + "v", 0.5, 0, 1);
        }
        trial.uniform("as", 11.5e-6, 9.5e-6, 13.5e-6).normal("theta", -0.1, 0.2).uniform("arc", 0.5, 0, 1);
        trial.uniform("da1", 0.5, 0, 1).uniform("da2", 0.5, 0, 1);
        trial.uniform("dt1", 0.5, 0, 1).uniform("dt2", 0.5, 0, 1);
        PUBLISHED.compare("9.5", trial.samples(200_000, 5).of((in, out) -> {
            double ls = 50_000_623 + 25 * student(18, in[0], in[1]);
            double comparator =
                    215 + 6 * student(24, in[2], in[3]) + 4 * student(5, in[4], in[5]) + 7 * student(8, in[6], in[7]);
            double theta = in[9] + 0.5 * StrictMath.sin(2 * Math.PI * in[10]);
            double expansion = trapezoid(1e-6, 0.1e-6, in[11], in[12]);
            double difference = trapezoid(0.05, 0.025, in[13], in[14]);
            out[0] = ls + comparator - ls * (expansion * theta + in[8] * difference) - 50e6;
        }));
    }

    private static double student(double degrees, double u, double v) {
        return Math.sqrt(degrees * (StrictMath.pow(u, -2 / degrees) - 1)) * StrictMath.cos(2 * Math.PI * v);
    }

    private static double trapezoid(double half, double play, double r1, double r2) {
        double from = -half - play + 2 * play * r1;
        return from - 2 * from * r2;
    }

    @Test
    void logarithm() {
        PUBLISHED.compare("ln", trial().uniform("x", 0.6, 0.1, 1.1).of((in, out) -> out[0] = StrictMath.log(in[0])));
    }

    @Test
    void endGauge() {
        Findings found = new Trial()
                .rss()
                .normal("lS", 50_000_623, 25)
                .normal("d", 215, 9.7)
                .uniform("aS", 11.5e-6, 9.5e-6, 13.5e-6)
                .normal("theta", -0.1, 0.41)
                .uniform("dAlpha", 0, -1e-6, 1e-6)
                .uniform("dTheta", 0, -0.05, 0.05)
                .of((in, out) -> out[0] = in[0] + in[1] - in[0] * (in[4] * in[3] + in[2] * in[5]));
        PUBLISHED.compare("H.1", found);
        RootSumSquare rss = found.rss().orElseThrow();
        List<String[]> rows = PublishedTable.rows("jcgm-100-h1.tsv", 4);
        for (String[] row : rows) {
            Sensitivity of = found.sensitivities().stream()
                    .filter(each -> each.given().equals(row[0]))
                    .findFirst()
                    .orElseThrow();
            assertThat(Math.sqrt(of.share()) * rss.standardUncertainty())
                    .as(row[0] + ": " + row[3])
                    .isCloseTo(Double.parseDouble(row[1]), within(Double.parseDouble(row[2])));
        }
        // H.1.7: two inputs whose first-order terms are nothing do bring something together.
        assertThat(rss.doubts().get(0).words()).isEqualTo("straight lines miss what theta and dAlpha do together");
    }

    /** Means, their uncertainties and correlations of the five readings of JCGM 100 H.2, Table H.2. */
    @Test
    void resistanceAndReactance() {
        double[] u = {0.0032094, 0.0094710e-3, 0.00075206};
        double vi = -0.3553;
        double vp = 0.8576;
        double ip = -0.6451;
        double l22 = Math.sqrt(1 - vi * vi);
        double l32 = (ip - vi * vp) / l22;
        double l33 = Math.sqrt(1 - vp * vp - l32 * l32);
        List<Findings> found = new Trial()
                .rss()
                .normal("z1", 0, 1)
                .normal("z2", 0, 1)
                .normal("z3", 0, 1)
                .outputs("R", "X", "Z")
                .all((in, out) -> {
                    double v = 4.9990 + u[0] * in[0];
                    double i = 19.6610e-3 + u[1] * (vi * in[0] + l22 * in[1]);
                    double phi = 1.044460 + u[2] * (vp * in[0] + l32 * in[1] + l33 * in[2]);
                    out[0] = v / i * StrictMath.cos(phi);
                    out[1] = v / i * StrictMath.sin(phi);
                    out[2] = v / i;
                });
        found.forEach(each -> PUBLISHED.compare("H.2 " + each.name(), each));
    }
}
