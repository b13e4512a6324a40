package sill.tests.benchmark;

import java.util.List;

/** The middle of some values, which a few disturbed ones don't move. */
final class Median {
    private Median() {}

    static double of(List<Double> values) {
        List<Double> sorted = values.stream().sorted().toList();
        int middle = sorted.size() / 2;
        return sorted.size() % 2 == 1 ? sorted.get(middle) : (sorted.get(middle - 1) + sorted.get(middle)) / 2;
    }
}
