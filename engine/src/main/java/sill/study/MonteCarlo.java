package sill.study;

import java.util.List;
import java.util.Optional;

/**
 * What sampling gave for one output.
 *
 * @param samples how many were drawn
 * @param seed the seed
 * @param failures samples without a finite result
 * @param statistics figures of the finite samples; none where fewer than two were finite
 * @param shares samples inside each window of the output, in the order of the plan
 */
public record MonteCarlo(
        long samples, long seed, Failures failures, Optional<Statistics> statistics, List<Share> shares) {
    public MonteCarlo {
        shares = List.copyOf(shares);
    }
}
