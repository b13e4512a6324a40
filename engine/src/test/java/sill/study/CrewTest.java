package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicReference;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;

@Timeout(60)
class CrewTest {
    private static Crew crew(int size) {
        return new Crew(Stream.generate(() -> new Probe((in, out) -> {}, 1, 1))
                .limit(size)
                .toList());
    }

    @Test
    void resultsComeInOrder() throws InterruptedException {
        List<Long> got = new ArrayList<>();
        crew(4).run(1000, (number, probe) -> number, got::add);
        assertThat(got).isEqualTo(LongStream.range(0, 1000).boxed().toList());
    }

    /** The second task waits until the first, on another thread, has begun: neither would end on one thread. */
    @Test
    void threadsWorkSideBySide() throws InterruptedException {
        CountDownLatch both = new CountDownLatch(2);
        List<Long> got = new ArrayList<>();
        crew(2).run(
                        2,
                        (number, probe) -> {
                            both.countDown();
                            both.await();
                            return number;
                        },
                        got::add);
        assertThat(got).containsExactly(0L, 1L);
    }

    @Test
    void whatATaskThrowsEndsAll() {
        assertThatThrownBy(() -> crew(3).run(
                                10_000,
                                (number, probe) -> {
                                    if (number == 5) {
                                        throw new IllegalStateException("five");
                                    }
                                    return number;
                                },
                                result -> {}))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("five");
        assertThat(Thread.currentThread().isInterrupted()).isFalse();
    }

    @Test
    void anInterruptEndsAStudyAndItsThreads() throws InterruptedException {
        CountDownLatch running = new CountDownLatch(1);
        AtomicReference<Throwable> ended = new AtomicReference<>();
        StudyPlan plan = new Trial()
                .uniform("x", 1, 0, 2)
                .samples(10_000_000_000L, 1)
                .cores(3)
                .plan();
        Thread study = new Thread(() -> {
            try {
                Study.run(plan, () -> (in, out) -> out[0] = in[0], (done, total) -> running.countDown());
            } catch (Throwable e) {
                ended.set(e);
            }
        });
        study.start();
        running.await();
        study.interrupt();
        study.join();
        assertThat(ended.get()).isInstanceOf(InterruptedException.class);
        assertThat(Thread.getAllStackTraces().keySet())
                .extracting(Thread::getName)
                .noneMatch(name -> name.startsWith("sill-study"));
    }

    @Test
    void anInterruptEndsASearchToo() {
        int[] calls = {0};
        assertThatThrownBy(() -> Study.run(
                        new Trial()
                                .uniform("x", 1, 0, 2)
                                .uniform("y", 1, 0, 2)
                                .worstCase()
                                .cores(1)
                                .plan(),
                        () -> (in, out) -> {
                            calls[0]++;
                            if (calls[0] == 1000) {
                                Thread.currentThread().interrupt();
                            }
                            out[0] = StrictMath.sin(5 * in[0]) * in[1];
                        },
                        Progress.NONE))
                .isInstanceOf(InterruptedException.class);
        assertThat(calls[0]).isBetween(1000, 1300);
    }

    @Test
    void progressGrowsToItsEnd() throws InterruptedException {
        List<Long> done = new ArrayList<>();
        long[] totals = new long[1];
        StudyPlan plan = new Trial()
                .uniform("x", 1, 0, 2)
                .uniform("y", 1, 0, 2)
                .worstCase()
                .samples(50_000, 1)
                .plan();
        Study.run(plan, () -> (in, out) -> out[0] = in[0] * in[1], (now, total) -> {
            done.add(now);
            totals[0] = total;
        });
        assertThat(done).isSorted().hasSizeGreaterThan(10);
        assertThat(done.get(done.size() - 1)).isEqualTo(totals[0]);
    }
}
