package sill.study;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;

/**
 * What to find out.
 *
 * @param inputs the inputs that vary, in the order in which the model takes them: 1 to 1000, no name twice
 * @param outputs the outputs studied, in the order in which the model gives them: 1 or more
 * @param worstCase whether to look for the extremes within the limits
 * @param rss whether to add tolerances as root-sum-square
 * @param sampling how to sample, if at all
 * @param cores how many threads may work at once, 1 or more; the findings don't depend on it
 */
public record StudyPlan(
        List<Varied> inputs,
        List<Studied> outputs,
        boolean worstCase,
        boolean rss,
        Optional<Sampling> sampling,
        int cores) {
    /** Sobol's points are known for so many dimensions. */
    private static final int MOST_INPUTS = 1000;

    public StudyPlan {
        inputs = List.copyOf(inputs);
        outputs = List.copyOf(outputs);
        Objects.requireNonNull(sampling, "sampling");
        if (inputs.isEmpty() || inputs.size() > MOST_INPUTS) {
            throw new IllegalArgumentException("inputs must be 1 to " + MOST_INPUTS + ", got " + inputs.size());
        }
        if (outputs.isEmpty()) {
            throw new IllegalArgumentException("outputs must be 1 or more, got 0");
        }
        if (cores < 1) {
            throw new IllegalArgumentException("cores must be 1 or more, got " + cores);
        }
        Set<String> names = new HashSet<>();
        for (Varied input : inputs) {
            if (!names.add(input.name())) {
                throw new IllegalArgumentException(
                        "inputs must have one name each, got \"" + input.name() + "\" twice");
            }
        }
    }
}
