package sill.worksheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sill.units.PublishedTable;
import sill.worksheet.Given.Quantity;

class MarkingCodeTest {
    static List<String[]> published() {
        return PublishedTable.rows("iec-60062-codes.tsv", 4);
    }

    @ParameterizedTest
    @MethodSource("published")
    void isReadBeforeItsUnit(String code, String unit, double value, String source) {
        Worksheet sheet = Worksheet.parse("sill 1\ntitle: T\n:: given G\nx = " + code + " " + unit);
        Quantity quantity =
                (Quantity) ((Cell.Givens) sheet.cells().get(0)).givens().get(0).value();

        assertThat(sheet.problems()).as(source).isEmpty();
        assertThat(quantity.nominal()).as(source).isEqualTo(value);
        assertThat(quantity.unit().coherent().symbol()).as(source).isEqualTo(unit);
    }
}
