package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** Links and ends of travel; the figures are in the published tables and the properties. */
class DividersTest {
    @Test
    void aLinkForOneResistorGivesTheEndOfTravel() {
        assertThat(Dividers.output(5, 0, 10)).isEqualTo(5);
        assertThat(Dividers.output(5, 10, 0)).isZero();
        assertThat(Dividers.output(5, 0, 10, 100)).isEqualTo(5);
        assertThat(Dividers.output(5, 10, 0, 100)).isZero();
        assertThat(Dividers.sourceResistance(0, 10)).isZero();
    }

    @Test
    void aLinkShortsWhatIsInParallel() {
        assertThat(Dividers.parallel(0, 5)).isZero();
        assertThat(Dividers.parallel(0.0, -0.0)).isZero();
        assertThat(Dividers.parallel(5)).isEqualTo(5);
    }
}
