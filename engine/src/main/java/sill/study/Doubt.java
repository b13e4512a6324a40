package sill.study;

import java.util.List;

/**
 * Where straight lines through the nominal point miss what the model gives, by more than a tenth.
 *
 * @param kind where
 * @param givens the inputs concerned: none for the extremes
 * @param linear the change from the nominal result that straight lines say
 * @param found the change that was found
 */
public record Doubt(Kind kind, List<String> givens, double linear, double found) {
    public Doubt {
        givens = List.copyOf(givens);
    }

    /** Where straight lines miss. */
    public enum Kind {
        /** One input alone at its lower limit. */
        ALONE_LOW,
        /** One input alone at its upper limit. */
        ALONE_HIGH,
        /** Two inputs together at limits. */
        TOGETHER,
        /** The lowest result found. */
        LOWEST,
        /** The highest result found. */
        HIGHEST,
        /** A slope could not be found. */
        NO_SLOPE
    }

    /** The doubt in words, without numbers. */
    public String words() {
        return switch (kind) {
            case ALONE_LOW -> "a straight line misses the result with " + givens.get(0) + " alone at its lower limit";
            case ALONE_HIGH -> "a straight line misses the result with " + givens.get(0) + " alone at its upper limit";
            case TOGETHER -> "straight lines miss what " + givens.get(0) + " and " + givens.get(1) + " do together";
            case LOWEST -> "straight lines miss the lowest result found";
            case HIGHEST -> "straight lines miss the highest result found";
            case NO_SLOPE -> "there is no finite slope with " + givens.get(0);
        };
    }
}
