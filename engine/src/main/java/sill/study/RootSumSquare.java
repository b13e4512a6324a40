package sill.study;

import java.util.List;

/**
 * Tolerances added as root-sum-square, by slopes at the nominal point.
 *
 * @param low nominal result less the root of the sum of squares of slope times the input's distance to the limit that
 *     lowers the result
 * @param high the same upwards
 * @param standardUncertainty combined standard uncertainty of first order for independent inputs, JCGM 100:2008 equation 10
 * @param doubts where straight lines miss the model by more than a tenth of the half-width, the worst first; empty where
 *     the linear picture is good
 */
public record RootSumSquare(double low, double high, double standardUncertainty, List<Doubt> doubts) {
    public RootSumSquare {
        doubts = List.copyOf(doubts);
    }

    /** Whether the figures deserve doubt. */
    public boolean linearPicturePoor() {
        return !doubts.isEmpty();
    }
}
