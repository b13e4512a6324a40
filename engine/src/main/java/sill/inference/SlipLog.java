package sill.inference;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;

/** The slips met so far. What is tried on approval is logged apart and kept or forgotten. */
final class SlipLog {
    private final Deque<List<Slip>> open = new ArrayDeque<>();

    SlipLog() {
        open.push(new ArrayList<>());
    }

    void add(Slip slip) {
        if (open.peek().stream().noneMatch(slip::isSameAs)) {
            open.peek().add(slip);
        }
    }

    void addAll(List<Slip> slips) {
        slips.forEach(this::add);
    }

    /** From here on slips are logged apart, until {@link #close}. */
    void open() {
        open.push(new ArrayList<>());
    }

    /** What was logged since {@link #open}; it is in the log no more. */
    List<Slip> close() {
        return open.pop();
    }

    /** All that stand, in the order of the text. */
    List<Slip> all() {
        return open.peek().stream()
                .sorted(Comparator.comparingInt(Slip::offset))
                .toList();
    }
}
