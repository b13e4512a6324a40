package sill.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class TraceTest {
    private final Trace trace = Traces.of("given a", "given b", "result c = a b", "result d = c", "check e = d x d");

    @Test
    void whatIsUsedKnowsItsUsers() {
        assertThat(trace.users(0)).containsExactly(2);
        assertThat(trace.users(2)).containsExactly(3);
        assertThat(trace.sources(2)).containsExactly(0, 1);
    }

    @Test
    void whatRestsOnAGivenIsFoundThroughAllSteps() {
        assertThat(trace.resting(0)).containsExactly(2, 3, 4);
        assertThat(trace.resting(4)).isEmpty();
    }

    @Test
    void aNameWithoutNodeIsPassedOver() {
        assertThat(trace.sources(4)).containsExactly(3);
        assertThat(trace.named("x")).isEmpty();
        assertThat(trace.named("c").map(TraceNode::at)).contains("1.3");
    }

    @Test
    void aValueIsNotMadeFromItself() {
        assertThat(Traces.of("result a = a").sources(0)).isEmpty();
        assertThat(Traces.of("result a = a").users(0)).isEqualTo(List.of());
    }
}
