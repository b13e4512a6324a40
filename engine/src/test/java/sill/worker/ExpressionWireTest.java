package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import org.junit.jupiter.api.Test;
import sill.formula.Expression;
import sill.units.Notation;
import sill.units.Unit;
import sill.values.Result;

class ExpressionWireTest {
    private static final String SHEET = """
            sill 1
            title: T
            :: given G
            vIn = 24 V
            rTop = 10 kΩ
            list = [1, 2, 3]
            :: calc C
            -vIn / 2 + sqrt(rTop) * Math.PI
            vIn > 3 && !(rTop < 1) || true
            vIn > 3 ? 1 : 0
            Dividers.parallel(rTop, 3)
            TripPoints trip = Comparators.noninverting(2, rTop, 2 * rTop, 0, 5);
            trip.rising() + trip.band()
            Series.E24.nearest(list[1])
            double own(double x) { return x * 2; }
            own(vIn)
            MarkingCode.parse("4K7")
            """;

    @Test
    void formulasOfEveryKindComeBack() {
        List<Result> results = Sheets.here(SHEET).results();
        assertThat(results).hasSize(9).allMatch(result -> result.meaning().isPresent());
        for (Result result : results) {
            Expression meaning = result.meaning().orElseThrow();
            WireOut out = new WireOut();
            ExpressionWire.write(out, meaning);
            assertThat(ExpressionWire.read(new WireIn(out.bytes()))).isEqualTo(meaning);
        }
    }

    @Test
    void formulaOfNoKindIsNoMessage() {
        assertThatExceptionOfType(WireIn.BadMessage.class)
                .isThrownBy(() ->
                        ExpressionWire.read(new WireIn(new WireOut().number(99).bytes())))
                .withMessage("there is no kind of formula 99");
    }

    @Test
    void deepFormulaIsNoMessage() {
        WireOut out = new WireOut();
        for (int i = 0; i < 100_000; i++) {
            out.number(5);
        }
        assertThatExceptionOfType(WireIn.BadMessage.class)
                .isThrownBy(() -> ExpressionWire.read(new WireIn(out.bytes())))
                .withMessage("a formula is nested deeper than 200");
    }

    @Test
    void printedNumbersAreNotSent() {
        assertThatIllegalArgumentException()
                .isThrownBy(() ->
                        ExpressionWire.write(new WireOut(), new Expression.Shown(Notation.printed(1, Unit.ONE, 4))))
                .withMessageStartingWith("a formula must be without printed numbers, got Shown");
    }
}
