package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;

class TableTest {
    private static Table bench() {
        return new Table(
                columns("t", new double[] {0, 1}, "vIn", new double[] {5, Double.NaN}, "note", List.of("a", "")));
    }

    @Test
    void columnsComeInTheFilesOrder() {
        Table table = bench();
        assertThat(table.rows()).isEqualTo(2);
        assertThat(table.numberColumns()).containsExactly("t", "vIn");
        assertThat(table.textColumns()).containsExactly("note");
        assertThat(table.column("vIn")).containsExactly(5, Double.NaN);
        assertThat(table.text("note")).containsExactly("a", "");
        assertThat(table).hasToString("Table of 2 rows: numbers [t, vIn], texts [note]");
    }

    @Test
    void aTableCannotBeChanged() {
        double[] values = {1, 2};
        List<String> texts = new ArrayList<>(List.of("a", "b"));
        Map<String, Object> columns = columns("v", values, "note", texts);
        Table table = new Table(columns);
        values[0] = 9;
        texts.set(0, "z");
        columns.clear();
        table.column("v")[1] = 9;
        assertThat(table.column("v")).containsExactly(1, 2);
        assertThat(table.text("note")).containsExactly("a", "b");
    }

    @Test
    void aTableWithoutColumnsHasNoRows() {
        assertThat(new Table(Map.of()).rows()).isZero();
    }

    @Test
    void aWrongNameGetsTheRightOnes() {
        refused("column must be one of [t, vIn], got \"vin\"", () -> bench().column("vin"));
        refused("column \"note\" holds text, not numbers; text(\"note\") gives it", () -> bench().column("note"));
        refused("text column must be one of [note], got \"t\"", () -> bench().text("t"));
    }

    @Test
    void wrongColumnsAreRefused() {
        refused(
                "column \"b\" must have 2 rows like the columns before it, got 1",
                () -> new Table(columns("a", new double[] {1, 2}, "b", new double[] {1})));
        refused("column \"a\" must be double[] or a list of String", () -> new Table(columns("a", new int[] {1})));
        refused("column \"a\" must be double[] or a list of String", () -> new Table(columns("a", List.of(1, 2))));
        refused(
                "column \"a\" must be double[] or a list of String",
                () -> new Table(columns("a", Arrays.asList("x", null))));
    }

    private static void refused(String message, ThrowingCallable call) {
        assertThatIllegalArgumentException().isThrownBy(call).withMessage(message);
    }

    private static Map<String, Object> columns(Object... namesAndValues) {
        Map<String, Object> columns = new LinkedHashMap<>();
        for (int i = 0; i < namesAndValues.length; i += 2) {
            columns.put((String) namesAndValues[i], namesAndValues[i + 1]);
        }
        return columns;
    }
}
