package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sill.stdlib.Table;

/** Data files follow RFC 4180, "Common Format and MIME Type for Comma-Separated Values (CSV) Files". */
class TableReaderTest {
    @Test
    void numbersAreReadInTheirColumnsUnit() throws TableReader.NoTable {
        Table table = read("t [ms],v [mV],temp [°C], plain \n1,-2.5e3,25,.5\n2,+4.,-10,1E2\n");

        assertThat(table.numberColumns()).containsExactly("t", "v", "temp", "plain");
        assertThat(table.column("t")).containsExactly(1e-3, 2e-3);
        assertThat(table.column("v")).containsExactly(-2.5, 4e-3);
        assertThat(table.column("temp")).containsExactly(298.15, 263.15);
        assertThat(table.column("plain")).containsExactly(0.5, 100);
    }

    @Test
    void anEmptyFieldOfNumbersIsNotANumber() throws TableReader.NoTable {
        assertThat(read("a,b\n1,\n,2\n").column("a")).containsExactly(1, Double.NaN);
        assertThat(read("a,b\n1,\n,2\n").column("b")).containsExactly(Double.NaN, 2);
    }

    @ParameterizedTest
    @ValueSource(strings = {"x", "1d", "0x1p3", "NaN", "Infinity", "1,5", "1 000", "1e", "--1", "."})
    void aFieldThatIsNoNumberMakesAColumnOfText(String field) throws TableReader.NoTable {
        Table table = read("a,b\n1,1\n2,\"" + field + "\"\n");

        assertThat(table.text("b")).containsExactly("1", field);
        assertThat(table.column("a")).containsExactly(1, 2);
    }

    /** RFC 4180, section 2, rules 5 to 7. */
    @Test
    void quotedFieldsHoldCommasQuotesAndLineBreaks() throws TableReader.NoTable {
        Table table = read("\"name, long\",n\r\n\"a \"\"b\"\"\",1\r\n\"two\r\nlines\",2\r\n");

        assertThat(table.text("name, long")).containsExactly("a \"b\"", "two\r\nlines");
        assertThat(table.column("n")).containsExactly(1, 2);
    }

    @ParameterizedTest
    @ValueSource(strings = {"a,b\n1,2", "a,b\r\n1,2\r\n", "\ufeffa,b\n1,2\n", "a,b\n\n1,2\n\n", "a,b\r1,2\r"})
    void lineEndsByteOrderMarkAndBlankLinesMakeNoDifference(String text) throws TableReader.NoTable {
        assertThat(read(text).column("a")).containsExactly(1);
        assertThat(read(text).column("b")).containsExactly(2);
    }

    @Test
    void aHeaderAloneIsATableWithoutRows() throws TableReader.NoTable {
        assertThat(read("a,b\n").rows()).isZero();
        assertThat(read("a,b\n").column("a")).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            ``                  | found nothing, expected a header line
            `\\n\\n`              | found nothing, expected a header line
            `a,b\\n1\\n`          | line 2: found 1 field, expected 2 as in the header
            `a,b\\n1,2\\n1,2,3\\n` | line 3: found 3 fields, expected 2 as in the header
            `a,a\\n1,2\\n`        | line 1: found the column 'a' twice, expected each name once
            `a [V],a [mV]\\n`    | line 1: found the column 'a' twice, expected each name once
            `a,\\n1,2\\n`         | line 1: found no name for column 2
            `a,[V]\\n1,2\\n`      | line 1: found no name for column 2
            `a [Vx]\\n1\\n`       | line 1: found 'Vx', expected a unit such as V, kΩ, µF or ppm/K
            `a []\\n1\\n`         | line 1: found nothing, expected a unit such as V, kΩ, µF or ppm/K
            `a,"b\\n1,2\\n`       | found a quoted field without its closing quote
            `a;b\\n1;2\\n`        | found semicolons, expected commas between the fields
            `a\\tb\\n1\\t2\\n`     | found tabs, expected commas between the fields
            """)
    void whatIsNoTableIsToldWithItsLine(String text, String message) {
        assertThatThrownBy(() -> read(text.replace("\\n", "\n").replace("\\t", "\t")))
                .isInstanceOf(TableReader.NoTable.class)
                .hasMessage(message);
    }

    @Test
    void bytesThatAreNotUtf8AreRefused() {
        for (byte[] bytes : new byte[][] {
            {'a', '\n', (byte) 0xFF}, "é\n1".getBytes(StandardCharsets.ISO_8859_1), {(byte) 0xC3},
        }) {
            assertThatThrownBy(() -> TableReader.read(bytes))
                    .isInstanceOf(TableReader.NoTable.class)
                    .hasMessage("found bytes that are not UTF-8 text");
        }
    }

    private static Table read(String text) throws TableReader.NoTable {
        return TableReader.read(text.getBytes(StandardCharsets.UTF_8)).table();
    }
}
