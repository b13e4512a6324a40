package sill.study;

import java.util.List;

/**
 * What was found within the limits.
 *
 * @param low the lowest finite result of all evaluations
 * @param high the highest one
 * @param directions how the result goes with each input, in the order of the plan
 * @param evaluations how many points were looked at, for all outputs together
 * @param failures those of them that gave no finite result
 */
public record WorstCase(Extreme low, Extreme high, List<Direction> directions, long evaluations, Failures failures) {
    public WorstCase {
        directions = List.copyOf(directions);
    }

    /** Whether the result goes one way with every input. */
    public boolean monotonic() {
        return !directions.contains(Direction.NEITHER);
    }
}
