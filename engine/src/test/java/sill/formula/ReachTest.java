package sill.formula;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ReachTest {
    @ParameterizedTest
    @CsvSource({
        "v, ''",
        "k, ' up'",
        "p, ' down'",
        "f, ' up down'",
        "R, ' up'",
        "κ, ''",
        "β, ' up down'",
        "gains, ' up down'",
        "cause, ''",
        "pause, ' down'",
        "i, ' up'"
    })
    void aTextReachesAsFarAsItsLetters(String text, String classes) {
        assertThat(Reach.of(text)).isEqualTo(classes);
    }
}
