package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The spec of Java in cells is the test: every example of {@code spec/java-cells.txt}. */
class JavaCellsSpecTest {
    private static final int EXAMPLES = 74;

    private final List<CellExample> examples = CellExample.all();

    @Test
    void everyExampleIsSeen() {
        assertThat(examples)
                .extracting(CellExample::number)
                .containsExactlyElementsOf(
                        IntStream.rangeClosed(1, EXAMPLES).boxed().toList());
    }

    @TestFactory
    Stream<DynamicTest> asWritten() {
        return each(text -> text);
    }

    @TestFactory
    Stream<DynamicTest> withCarriageReturns() {
        return each(text -> text.replace("\n", "\r\n"));
    }

    private Stream<DynamicTest> each(UnaryOperator<String> change) {
        return examples.stream()
                .map(example -> DynamicTest.dynamicTest(
                        example.toString(),
                        () -> assertThat(RunNotation.of(
                                        Sheets.here(change.apply(example.worksheet())), example.showsTrace()))
                                .isEqualTo(example.expected())));
    }
}
