package sill.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class StreamTest {
    /** The loop with its state in registers against the library's own calls. */
    @Property(tries = 100)
    void filledDrawsAreThoseOfTheLibrary(@ForAll long seed, @ForAll long block) {
        Stream filled = Stream.of(seed, block);
        Stream called = Stream.of(seed, block);
        double[] values = new double[90];
        filled.uniform(values, 1, 3, 90, 2, 5);
        for (int i = 1; i < 90; i += 3) {
            assertThat(values[i]).isEqualTo(2 + 5 * called.nextDouble());
            assertThat(values[i - 1]).isZero();
        }
        assertThat(filled.nextLong()).isEqualTo(called.nextLong());
    }

    @Test
    void neighbouringBlocksAndSeedsDrawOtherNumbers() {
        long[] first = {
            Stream.of(0, 0).nextLong(),
            Stream.of(0, 1).nextLong(),
            Stream.of(1, 0).nextLong(),
            Stream.of(1, 1).nextLong()
        };
        assertThat(Arrays.stream(first).distinct()).hasSize(4);
    }

    @Property(tries = 200)
    void sortingByBucketsIsSorting(@ForAll double[] values, @ForAll boolean many) {
        double[] mine = new double[many ? 3000 : values.length];
        for (int i = 0; i < mine.length; i++) {
            double value = values.length == 0 ? Double.NaN : values[i % values.length] * (1 + i / values.length % 7);
            mine[i] = Double.isInfinite(value) ? Double.NaN : value + 0.0;
        }
        double[] expected = mine.clone();
        Arrays.sort(expected);
        BucketSort.sort(mine);
        assertThat(mine).isEqualTo(expected);
    }
}
