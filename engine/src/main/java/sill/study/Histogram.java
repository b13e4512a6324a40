package sill.study;

import java.util.List;

/**
 * Counts of samples in classes.
 *
 * @param edges the limits of the classes, rising, one more than classes
 * @param counts samples above the lower and up to the upper edge of each class; the first holds its lower edge too
 * @param below samples below the first edge: a long tail is cut off the picture
 * @param above samples above the last edge
 */
public record Histogram(List<Double> edges, List<Long> counts, long below, long above) {
    public Histogram {
        edges = List.copyOf(edges);
        counts = List.copyOf(counts);
    }
}
