package sill.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Name;
import sill.formula.Expression.Operator;
import sill.markup.Markup;
import sill.units.Notation;
import sill.units.Unit;

/** The markup itself; what it means is tested on whole pages. */
class MathWriterTest {
    private static String first(Expression expression) {
        Markup page = new Markup();
        MathWriter.first(page, expression);
        return page.toString();
    }

    private static Expression over(Expression top, Expression bottom) {
        return new Arithmetic(Operator.OVER, top, bottom);
    }

    @Test
    void symbolHasAnUprightIndex() {
        assertThat(first(new Name("vRise"))).isEqualTo("<math><msub><mi>v</mi><mi>Rise</mi></msub></math>");
        assertThat(first(new Name("r1"))).isEqualTo("<math><msub><mi>r</mi><mn>1</mn></msub></math>");
        assertThat(first(new Name("vX")))
                .isEqualTo("<math><msub><mi>v</mi><mi mathvariant=\"normal\">X</mi></msub></math>");
    }

    @Test
    void wordIsMarkedAsOne() {
        assertThat(first(new Name("band"))).isEqualTo("<math><mi class=\"word\">band</mi></math>");
    }

    @Test
    void furtherSideStartsWithItsEqualsSign() {
        Markup page = new Markup();
        MathWriter.next(page, over(new Name("a"), new Name("b")));
        assertThat(page.toString())
                .isEqualTo("<math><mo form=\"infix\">=</mo><mfrac><mi>a</mi><mi>b</mi></mfrac></math>");
    }

    @Test
    void namesTellTheirPlaces() {
        Markup page = new Markup();
        Expression formula = over(new Name("vRise"), new Arithmetic(Operator.TIMES, new Name("band"), new Name("x")));
        MathWriter.next(page, formula, name -> name.equals("x") ? "" : "at-" + name);
        assertThat(page.toString())
                .isEqualTo("<math><mo form=\"infix\">=</mo><mfrac>"
                        + "<msub><mi class=\"at-vRise\">v</mi><mi>Rise</mi></msub>"
                        + "<mrow><mi class=\"word at-band\">band</mi>"
                        + "<mo form=\"infix\">⋅</mo><mi>x</mi></mrow></mfrac></math>");
    }

    @Test
    void aComponentTellsThePlaceOfItsRecord() {
        Markup page = new Markup();
        MathWriter.first(page, new Expression.Component(new Name("tripLow"), "rising"), name -> "at-" + name);
        assertThat(page.toString())
                .isEqualTo("<math><msub><mi class=\"word at-tripLow\">trip</mi>"
                        + "<mrow><mi>Low</mi><mo>,</mo><mi>rising</mi></mrow></msub></math>");
    }

    @Test
    void functionsAndIndicesAreNoNames() {
        Markup page = new Markup();
        Expression call = new Expression.Call("find", "", List.of(new Expression.Literal("1", 1)));
        MathWriter.first(page, call, name -> "at-" + name);
        assertThat(page.toString()).contains("<mi>find</mi>").doesNotContain("at-");
    }

    @Test
    void unitStandsUprightBehindItsNumber() throws Exception {
        assertThat(first(new Expression.Shown(Notation.printed(-0.0015, Unit.parse("V"), 4))))
                .isEqualTo("<math><mo form=\"prefix\">−</mo><mn>1.500</mn><mtext>\u00A0mV</mtext></math>");
    }

    @Test
    void bracketsGrowWithWhatIsTall() {
        Expression fraction = over(new Name("a"), new Name("b"));
        Expression low = new Arithmetic(Operator.MINUS, new Name("a"), new Name("b"));
        assertThat(first(new Expression.Function(MathFunction.LOG, List.of(fraction))))
                .contains("stretchy=\"true\"")
                .doesNotContain("stretchy=\"false\"");
        assertThat(first(new Expression.Function(MathFunction.LOG, List.of(low))))
                .contains("stretchy=\"false\"")
                .doesNotContain("stretchy=\"true\"");
    }

    @Test
    void functionIsAppliedForAScreenReader() {
        assertThat(first(new Expression.Function(MathFunction.SIN, List.of(new Name("x")))))
                .startsWith("<math><mi>sin</mi><mo>&#x2061;</mo><mrow>");
    }

    @Test
    void longFormulaBreaksBeforeItsOperators() {
        Expression sum = new Name("first");
        for (int i = 0; i < 6; i++) {
            sum = new Arithmetic(Operator.PLUS, sum, new Name("further"));
        }
        String[] pieces = first(sum).split("<wbr>");
        assertThat(pieces).hasSize(7);
        assertThat(pieces[3]).startsWith("<math><mo form=\"infix\">+</mo>").endsWith("</math>");
    }

    @Test
    void wideQuotientIsWrittenWithASolidus() {
        Expression sum = new Name("first");
        for (int i = 0; i < 12; i++) {
            sum = new Arithmetic(Operator.PLUS, sum, new Name("further"));
        }
        assertThat(first(over(sum, new Name("x"))))
                .doesNotContain("<mfrac>")
                .contains("<mo form=\"infix\">/</mo>")
                .contains("<mo form=\"prefix\" stretchy=\"false\">(</mo>");
    }

    @Test
    void textOfTheWorksheetIsEscaped() {
        assertThat(first(new Expression.Call("find", "", List.of(new Expression.Text("<b>&\"")))))
                .contains("<mtext>“&lt;b&gt;&amp;&quot;”</mtext>");
    }
}
