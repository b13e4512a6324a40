package sill.markup;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HexFormat;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.CharRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class VisibleTextTest {
    @Test
    void plainTextStays() {
        assertThat(VisibleText.of("8k2 Ω ± 1 %\n\tµ → “x”")).isEqualTo("8k2 Ω ± 1 %\n\tµ → “x”");
    }

    /**
     * The bidirectional formatting characters of Unicode Standard Annex 9, table 2, which can make a line read otherwise than
     * it runs, and others without a glyph.
     */
    @ParameterizedTest
    @CsvSource({
        "0000", "0007", "001B", "007F", "0085", "00AD", "061C", "200B", "200E", "200F", "2028", "2029", "202A", "202B",
        "202C", "202D", "202E", "2060", "2066", "2067", "2068", "2069", "FEFF", "FFFF", "D800", "DC00"
    })
    void aHiddenCharacterIsShownByItsCode(String hex) {
        String hidden = Character.toString((char) HexFormat.fromHexDigits(hex));
        assertThat(VisibleText.of("a" + hidden + "b")).isEqualTo("a[U+" + hex + "]b");
    }

    @Test
    void charactersBeyondTheBasicPlane() {
        assertThat(VisibleText.of("\uD83D\uDD0C\uDB40\uDC41")).isEqualTo("\uD83D\uDD0C[U+E0041]");
    }

    @Test
    void lineEndsAreOneKind() {
        assertThat(VisibleText.of("a\r\nb\rc")).isEqualTo("a\nb[U+000D]c");
    }

    @Property
    void whatIsVisibleStaysSo(@ForAll @CharRange(from = 0, to = 0xFFFF) String text) {
        String once = VisibleText.of(text);
        assertThat(VisibleText.of(once)).isEqualTo(once);
    }
}
