package sill.worksheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The spec of the worksheet's text is the test: every example of {@code spec/worksheet-text.txt}. */
class WorksheetTextSpecTest {
    private static final int EXAMPLES = 203;

    private final List<SpecExample> examples = SpecExample.all();

    @Test
    void everyExampleIsSeen() {
        assertThat(examples)
                .extracting(SpecExample::number)
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

    @TestFactory
    Stream<DynamicTest> withByteOrderMark() {
        return each(text -> "\ufeff" + text);
    }

    @TestFactory
    Stream<DynamicTest> withLineEndAtTheEnd() {
        return each(text -> text + "\n");
    }

    @TestFactory
    Stream<DynamicTest> everyPrefixAndSuffixIsRead() {
        return examples.stream()
                .map(example -> DynamicTest.dynamicTest(example.toString(), () -> {
                    String text = example.worksheet();
                    for (int cut = 0; cut <= text.length(); cut++) {
                        assertThat(Worksheet.parse(text.substring(0, cut)).problems())
                                .isNotNull();
                        assertThat(Worksheet.parse(text.substring(cut)).problems())
                                .isNotNull();
                    }
                }));
    }

    private Stream<DynamicTest> each(UnaryOperator<String> change) {
        return examples.stream()
                .map(example -> DynamicTest.dynamicTest(
                        example.toString(),
                        () -> assertThat(SpecNotation.of(
                                        Worksheet.parse(change.apply(example.worksheet())), example.kind()))
                                .isEqualTo(example.expected())));
    }
}
