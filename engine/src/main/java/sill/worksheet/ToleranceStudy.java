package sill.worksheet;

import java.util.List;
import java.util.Optional;

/**
 * What a tolerance cell asks for.
 *
 * @param of the results and expressions to study
 * @param methods how; at least one
 * @param vary givens to vary; empty means every given with limits that the results rest on
 * @param hold givens to hold at nominal
 * @param over a given along which the results are drawn, from limit to limit
 */
public record ToleranceStudy(
        List<Target> of, List<Method> methods, List<Target> vary, List<Target> hold, Optional<Target> over) {
    public ToleranceStudy {
        of = List.copyOf(of);
        methods = List.copyOf(methods);
        vary = List.copyOf(vary);
        hold = List.copyOf(hold);
    }

    /** A piece of text with its place: an expression after {@code of:}, a name after {@code vary:} or {@code hold:}. */
    public record Target(String text, int line, int column) {
        /** The text without spaces: a check that says the same is judged on what is found here. */
        public String key() {
            return Check.key(text);
        }
    }

    /** A way to push tolerances through the calculation. */
    public sealed interface Method {
        record WorstCase() implements Method {}

        record RootSumSquare() implements Method {}

        record MonteCarlo(int samples, long seed) implements Method {}
    }
}
