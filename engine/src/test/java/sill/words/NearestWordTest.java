package sill.words;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestWordTest {
    private static final List<String> KNOWN = List.of("title", "number", "revision", "date", "of", "V", "v2");

    @ParameterizedTest
    @CsvSource({
        "titel, title",
        "Title, title",
        "TITLE, title",
        "numbr, number",
        "revison, revision",
        "dat, date",
        "off, of",
        "v, V",
        "V2, v2"
    })
    void isTheWordMeant(String typed, String meant) {
        assertThat(NearestWord.to(typed, KNOWN)).hasValue(meant);
    }

    @ParameterizedTest
    @CsvSource({"customer", "xyz", "x", "ab", "''"})
    void isNoneWhenNothingIsNear(String typed) {
        assertThat(NearestWord.to(typed, KNOWN)).isEmpty();
    }

    @Test
    void isNotSoughtForTextNobodyMisspells() {
        assertThat(NearestWord.to("t".repeat(1_000_000), KNOWN)).isEmpty();
    }

    @Test
    void makesAHint() {
        assertThat(NearestWord.hint("titel", KNOWN, "Otherwise.")).isEqualTo("Did you mean 'title'?");
        assertThat(NearestWord.hint("xyz", KNOWN, "Otherwise.")).isEqualTo("Otherwise.");
    }
}
