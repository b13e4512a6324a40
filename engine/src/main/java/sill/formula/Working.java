package sill.formula;

import java.util.List;
import java.util.Optional;

/**
 * The working of a result, as lines to print: its own, and beneath it one for each call whose form is known.
 *
 * @param lines the result's own line first
 */
public record Working(List<Line> lines) {
    public Working {
        lines = List.copyOf(lines);
    }

    /**
     * A line <i>left = formula = numbers = shown</i>.
     *
     * @param left empty for a bare expression
     * @param formula empty when the numbers say as much
     * @param numbers the formula with the numbers put in; empty when they add nothing
     * @param shown the value as the record prints it; empty when the line has none of its own
     */
    public record Line(
            Optional<Expression> left, Optional<Expression> formula, Optional<Expression> numbers, String shown) {}
}
