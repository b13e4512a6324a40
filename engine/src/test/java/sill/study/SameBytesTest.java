package sill.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SameBytesTest {
    private static List<Findings> study(int cores, long samples) {
        Trial trial = new Trial()
                .uniform("v", 24, 22.8, 25.2)
                .normal("ref", 5, 0.02)
                .triangular("in", 8200, 8118, 8400)
                .uniform("fb", 220e3, 217.8e3, 222.2e3)
                .outputs("trip", "peak")
                .worstCase()
                .rss()
                .samples(samples, 42)
                .cores(cores);
        return trial.all(() -> (in, out) -> {
            out[0] = in[1] * (1 + in[2] / in[3]) - in[0] * in[2] / in[3];
            out[1] = (in[0] - 24) * (in[0] - 24) + StrictMath.sin(in[2] * 0.05);
        });
    }

    /** Records compare by value, doubles in them by their bits. */
    @ParameterizedTest
    @ValueSource(longs = {2, 4095, 20_001, 1_300_000})
    void anyNumberOfCoresGivesTheSame(long samples) {
        List<Findings> one = study(1, samples);
        assertThat(study(2, samples)).isEqualTo(one);
        assertThat(study(3, samples)).isEqualTo(one);
    }
}
