package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import org.junit.jupiter.api.Test;

class PublishedTableTest {
    @Test
    void rowsKnowTheirPlaceAndColumns() {
        List<PublishedTable.Row> rows =
                PublishedTable.parse("x.txt", List.of("# source: a book", "a | b", "", "# note", "1 | 2", "3 |"));
        assertThat(rows).extracting(PublishedTable.Row::place).containsExactly("x.txt:5", "x.txt:6");
        assertThat(rows).extracting(row -> row.get("b")).containsExactly("2", "");
    }

    @Test
    void aFileWithoutSourceIsRefused() {
        refused("x.txt: a line \"# source: …\" must say where the values are from", "# source:", "a", "1");
        refused("x.txt: a line \"# source: …\" must say where the values are from", "a", "1");
    }

    @Test
    void aFileWithoutRowsOrWithALameRowIsRefused() {
        refused("x.txt: must have one row or more", "# source: a book", "a | b");
        refused("x.txt:3: must have 2 fields, got 1", "# source: a book", "a | b", "1");
    }

    private static void refused(String message, String... lines) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> PublishedTable.parse("x.txt", List.of(lines)))
                .withMessage(message);
    }
}
