package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/** Examples of the spec with a piece cut off or out, as text is while it is typed: there is a result, whatever is left. */
class CutCellsTest {
    private static final int CUTS = 3;

    @TestFactory
    Stream<DynamicTest> everyExampleCut() {
        Random random = new Random(20260101);
        return CellExample.all().stream()
                .map(example -> DynamicTest.dynamicTest(example.toString(), () -> {
                    for (int cut = 0; cut < CUTS; cut++) {
                        String text = cut(example.worksheet(), cut, random);
                        // A loop that a cut has left without its end would need a worker to be stopped.
                        if (!text.contains("while")) {
                            assertThat(Sheets.here(text).cells()).as(text).isNotNull();
                        }
                    }
                }));
    }

    private static String cut(String text, int kind, Random random) {
        int head = text.indexOf(":: ", text.indexOf("title"));
        int a = head + random.nextInt(text.length() - head);
        int b = head + random.nextInt(text.length() - head);
        return switch (kind % 3) {
            case 0 -> text.substring(0, a);
            case 1 -> text.substring(0, text.indexOf('\n', head) + 1) + text.substring(a);
            default -> text.substring(0, Math.min(a, b)) + text.substring(Math.max(a, b));
        };
    }
}
