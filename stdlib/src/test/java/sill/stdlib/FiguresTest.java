package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class FiguresTest {
    @Test
    void aPrintedNumberHoldsToHalfItsLastDigit() {
        assertThatCode(() -> Figures.assertPrinted("x", "35.2e-3", 0.03525)).doesNotThrowAnyException();
        assertThatThrownBy(() -> Figures.assertPrinted("x", "35.2e-3", 0.03526)).isInstanceOf(AssertionError.class);
    }

    @Test
    void aFailureTellsAllOfIt() {
        assertThatThrownBy(() -> Figures.assertWithin("band", 2, 2.5, 0.25)).hasMessage("""
                        band
                          expected       2.0
                          actual         2.5
                          relative error 0.25
                          tolerance      ± 0.25""");
        assertThatThrownBy(() -> Figures.assertWithin("band", 2, Double.NaN, 0.25))
                .isInstanceOf(AssertionError.class);
    }
}
