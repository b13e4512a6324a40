package sill.study;

import java.util.List;
import java.util.Optional;

/**
 * What a study found for one output.
 *
 * @param name the output
 * @param nominal its value at the nominal point
 * @param worstCase extremes within the limits, if asked for
 * @param rss tolerances as root-sum-square, if asked for
 * @param monteCarlo what sampling gave, if asked for
 * @param sensitivities one for each input, the largest share first
 */
public record Findings(
        String name,
        double nominal,
        Optional<WorstCase> worstCase,
        Optional<RootSumSquare> rss,
        Optional<MonteCarlo> monteCarlo,
        List<Sensitivity> sensitivities) {
    public Findings {
        sensitivities = List.copyOf(sensitivities);
    }
}
