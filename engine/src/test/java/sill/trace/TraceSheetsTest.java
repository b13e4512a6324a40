package sill.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.plot.TextWidth;

class TraceSheetsTest {
    /** 1 point is 1/72 inch, 1 CSS pixel 1/96 inch (CSS Values and Units, section 6.2). */
    @ParameterizedTest
    @CsvSource({"60, 3", "60, 4", "60, 5", "150, 6", "150, 7"})
    void lettersArePrintedSevenPointsHighOrMore(int size, long seed) {
        TraceSheets sheets = TraceSheets.of(TraceLayout.of(Traces.ofSize(size, seed)));
        assertThat(sheets.parts()).isNotEmpty();
        assertThat(TextWidth.FONT_SIZE * sheets.scale() * 72 / 96).isGreaterThanOrEqualTo(7);
        for (TraceSheets.Part part : sheets.parts()) {
            assertThat(part.width() * sheets.scale()).isLessThanOrEqualTo(262 / 25.4 * 96 + 1e-6);
            assertThat(part.height() * sheets.scale()).isLessThanOrEqualTo(125 / 25.4 * 96 + 1e-6);
        }
    }

    @ParameterizedTest
    @CsvSource({"60, 3", "60, 4", "60, 5", "150, 6", "150, 7"})
    void everyBoxStandsWholeOnOnePart(int size, long seed) {
        TraceLayout layout = TraceLayout.of(Traces.ofSize(size, seed));
        List<TraceSheets.Part> parts = TraceSheets.of(layout).parts();
        assertThat(layout.boxes())
                .allMatch(box -> parts.stream()
                        .anyMatch(part -> box.x() >= part.x()
                                && box.x() + box.width() <= part.x() + part.width()
                                && box.y() >= part.y()
                                && box.y() + box.height() <= part.y() + part.height()));
    }

    /** Every line between two columns is whole on a part, from left to right. */
    @Test
    void aPartBeginsWithTheColumnThatTheOneBeforeEndsWith() {
        TraceLayout layout = TraceLayout.of(Traces.ofSize(60, 3));
        List<TraceSheets.Part> parts = TraceSheets.of(layout).parts();
        assertThat(layout.lines())
                .allMatch(line -> parts.stream()
                        .anyMatch(part -> line.fromX() >= part.x() && line.toX() <= part.x() + part.width()));
    }

    @Test
    void whatCanBeReadOnOneSheetStaysWhole() {
        assertThat(TraceSheets.of(TraceLayout.of(Traces.of("given a", "result b = a")))
                        .parts())
                .isEmpty();
    }
}
