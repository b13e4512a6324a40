package sill.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.CharRange;
import net.jqwik.api.constraints.Chars;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Lexical structure after The Java Language Specification, Java SE 17 Edition, sections 3.7 and 3.10. */
class CodeTextTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            `a // b`               | `a     `
            `a /* b */ c`          | `a         c`
            `a /* b // */ c`       | `a            c`
            `a // b /* c`          | `a          `
            `"a // b" + c`         | `"______" + c`
            `"a \\" b" + c`         | `"______" + c`
            `'"' + "'"`            | `'_' + "_"`
            `'\\'' + 1`             | `'__' + 1`
            `\"""a " b\""" + c`    | `\"""_____\""" + c`
            `\"""a \\\""" b\""" + c` | `\"""________\""" + c`
            `"open`                | `"____`
            `a / b * c`            | `a / b * c`
            """)
    void commentsAreBlankAndQuotesAreMasked(String text, String code) {
        assertThat(CodeText.codeOnly(text)).isEqualTo(code);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            `a /* b`         | 2
            `a /* b */ /* c` | 10
            `/* a */`        | -1
            `// /* a`        | -1
            `"/*"`           | -1
            """)
    void aCommentThatIsNotClosedIsFound(String text, int at) {
        assertThat(CodeText.unclosedComment(text)).isEqualTo(at);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            `a   +\\n  b`             | a + b
            `f(a, // first\\n  b)`    | f(a, b)
            `"two  spaces"  +  c`    | "two  spaces" + c
            `a /* why */ + b`        | a + b
            """)
    void oneLineKeepsWhatIsQuotedAndDropsComments(String text, String line) {
        assertThat(CodeText.oneLine(text.replace("\\n", "\n"))).isEqualTo(line);
    }

    @Property
    void theMaskKeepsLengthAndLineBreaks(
            @ForAll @Chars({'"', '\'', '/', '*', '\\', '\n', ' '}) @CharRange(from = 'a', to = 'c') String text) {
        String code = CodeText.codeOnly(text);

        assertThat(code).hasSameSizeAs(text);
        for (int i = 0; i < text.length(); i++) {
            assertThat(code.charAt(i) == '\n').isEqualTo(text.charAt(i) == '\n');
        }
    }
}
