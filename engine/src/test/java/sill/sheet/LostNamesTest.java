package sill.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What Java that can't be parsed probably declares, and which bracket is to blame. */
class LostNamesTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            `double x = 3 +;`                     | {x=7}
            `final int[] rows = {1, 2;`           | {rows=12}
            `Map<String, List<Integer>> m = (;`   | {m=27}
            `double f(double x) { return x`       | {f=7}
            `public static <T> void`              | {}
            `record P(double x) {`                | {P=7}
            `sealed interface Shape permits A {`  | {Shape=17}
            `double a = (1;\\ndouble b = 2;\\n    double inner = 3;` | {a=7, b=22}
            `return x`                            | {}
            `x = (3`                              | {}
            `var y = 3 +;`                        | {y=4}
            """)
    void namesAreFoundWhereALineDeclaresThem(String code, String names) {
        String text = code.replace("\\n", "\n");

        assertThat(LostNames.in(text, new Span(0, text.length()))).hasToString(names);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            `f(a[1)`      | 3 | found '[' without its ']'
            `f(a`         | 1 | found '(' without its ')'
            `f { g(a) `   | 2 | found '{' without its '}'
            `f(a))`       | 4 | found ')' without its '('
            `}`           | 0 | found '}' without its '{'
            """)
    void theBracketWithoutAPartnerIsTold(String code, int at, String message) {
        assertThat(Brackets.fault(code, new Span(0, code.length())))
                .contains(new SnippetParser.Fault(at, Wording.OURS, message));
    }

    @Test
    void pairedBracketsAreNoFault() {
        assertThat(Brackets.fault("f(a[1], {})", new Span(0, 11))).isEmpty();
        assertThat(Brackets.fault(") f(a) (", new Span(2, 6))).isEmpty();
    }
}
