package sill.words;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class QuotedTest {
    @Test
    void quotesAndCuts() {
        assertThat(Quoted.of("8k2 Ω")).isEqualTo("'8k2 Ω'");
        assertThat(Quoted.of("")).isEqualTo("''");
        assertThat(Quoted.of("x".repeat(40))).isEqualTo("'" + "x".repeat(40) + "'");
        assertThat(Quoted.of("x".repeat(41))).isEqualTo("'" + "x".repeat(40) + "…'");
        assertThat(Quoted.of("𝛺".repeat(41))).isEqualTo("'" + "𝛺".repeat(40) + "…'");
    }

    @Test
    void namesWhatDoesNotPrint() {
        assertThat(Quoted.of("a\0b\tc\u202e\ud800\u200b\u2028")).isEqualTo("'aU+0000bU+0009cU+202EU+D800U+200BU+2028'");
    }
}
