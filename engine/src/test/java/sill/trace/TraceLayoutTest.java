package sill.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sill.trace.TraceLayout.Box;
import sill.trace.TraceLayout.Line;

class TraceLayoutTest {
    private static List<Integer> layers(String... lines) {
        return TraceLayout.of(Traces.of(lines)).boxes().stream().map(Box::layer).toList();
    }

    @Test
    void aNodeStandsRightOfTheLongestWayToIt() {
        assertThat(layers("given a", "result b = a", "result c = a b", "result d = c a", "check e = b"))
                .containsExactly(0, 1, 2, 3, 4);
    }

    @Test
    void aGivenStandsLeftOfItsFirstUser() {
        assertThat(layers("given a", "given b", "given lone", "result c = a", "result d = c b", "check e = d"))
                .containsExactly(0, 1, 0, 1, 2, 3);
    }

    @Test
    void checksShareTheLastLayer() {
        assertThat(layers("given a", "result b = a", "result c = b", "check d = a", "check e = c"))
                .containsExactly(0, 1, 2, 3, 3);
    }

    /** What a loop makes: {@code for (…) { a = b + x; b = a; }}. */
    @Test
    void valuesMadeFromEachOtherAreDrawnOnceAndMarked() {
        TraceLayout layout = TraceLayout.of(Traces.of("given x", "result a = b x", "result b = a", "check c = b"));
        assertThat(layout.lines().stream().filter(Line::mutual)).hasSize(1);
        // The fourth is the way of b past the layer of a.
        assertThat(layout.lines()).hasSize(4);
    }

    @Test
    void aLongerCircleIsOpened() {
        TraceLayout layout = TraceLayout.of(Traces.of("result a = c", "result b = a", "result c = b"));
        assertThat(layout.boxes().stream().map(Box::layer).distinct()).hasSize(3);
        assertThat(layout.lines().stream().filter(Line::mutual)).hasSize(1);
    }

    @ParameterizedTest
    @CsvSource({"1, 1", "9, 2", "60, 3", "60, 4", "60, 5", "150, 6"})
    void everyUseLeadsToTheRight(int size, long seed) {
        Trace trace = Traces.ofSize(size, seed);
        List<Box> boxes = TraceLayout.of(trace).boxes();
        for (int node = 0; node < size; node++) {
            for (int source : trace.sources(node)) {
                assertThat(boxes.get(source).x() + boxes.get(source).width())
                        .isLessThan(boxes.get(node).x());
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"1, 1", "9, 2", "60, 3", "60, 4", "60, 5", "150, 6"})
    void boxesNeitherOverlapNorLeaveTheDrawing(int size, long seed) {
        TraceLayout layout = TraceLayout.of(Traces.ofSize(size, seed));
        assertThat(layout.boxes()).hasSize(size);
        for (Box a : layout.boxes()) {
            assertThat(a.x()).isPositive();
            assertThat(a.y()).isPositive();
            assertThat(a.x() + a.width()).isLessThan(layout.width());
            assertThat(a.y() + a.height()).isLessThan(layout.height());
            for (Box b : layout.boxes()) {
                boolean apart = a.x() + a.width() < b.x()
                        || b.x() + b.width() < a.x()
                        || a.y() + a.height() < b.y()
                        || b.y() + b.height() < a.y();
                assertThat(a == b || apart).as(a + " and " + b).isTrue();
            }
        }
    }

    /** A line that ran under a box would seem to end there. */
    @ParameterizedTest
    @CsvSource({"60, 3", "60, 4", "150, 6"})
    void noLinePassesUnderABox(int size, long seed) {
        TraceLayout layout = TraceLayout.of(Traces.ofSize(size, seed));
        assertThat(layout.lines().stream().filter(line -> line.endX() > line.toX()))
                .isNotEmpty()
                .allSatisfy(line -> assertThat(layout.boxes())
                        .noneMatch(box -> box.x() >= line.toX()
                                && box.x() + box.width() <= line.endX()
                                && box.y() <= line.toY()
                                && box.y() + box.height() >= line.toY()));
    }

    @Test
    void everyUseIsAWayOfLines() {
        Trace trace = Traces.ofSize(60, 3);
        TraceLayout layout = TraceLayout.of(trace);
        for (int node = 0; node < 60; node++) {
            Box box = layout.boxes().get(node);
            long arriving = layout.lines().stream()
                    .filter(line ->
                            line.endX() == box.x() && line.toY() >= box.y() && line.toY() <= box.y() + box.height())
                    .count();
            assertThat(arriving).isEqualTo(trace.sources(node).size());
        }
    }

    /** Two crossed pairs come apart; the best order of this small drawing is known. */
    @Test
    void crossingsAreUndone() {
        TraceLayout layout = TraceLayout.of(
                Traces.of("given a", "given b", "given c", "result x = c", "result y = b", "result z = a"));
        List<Box> boxes = layout.boxes();
        for (int[] pair : new int[][] {{0, 5}, {1, 4}, {2, 3}}) {
            assertThat(boxes.get(pair[0]).y()).isEqualTo(boxes.get(pair[1]).y());
        }
    }

    @Test
    void theSameTraceIsTheSameLayout() {
        assertThat(TraceLayout.of(Traces.ofSize(60, 3))).isEqualTo(TraceLayout.of(Traces.ofSize(60, 3)));
    }
}
