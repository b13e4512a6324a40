package sill.inference;

import java.util.List;
import java.util.Map;
import java.util.function.Function;

/**
 * Runs a body for its arguments. Bare numbers are pure numbers there, unless the body then slips: in that case they fit
 * anything, so that a bare number passed straight to a method takes the unit that the method wants, as it does with a helper.
 */
final class Trial {
    private Trial() {}

    /**
     * What a body leaves.
     *
     * @param slips those in it
     * @param altered what the containers among its parameters hold at its end
     */
    record Outcome(Value value, List<Slip> slips, Map<Integer, Value> altered) {
        Outcome(Value value, List<Slip> slips) {
            this(value, slips, Map.of());
        }
    }

    static Outcome run(List<Value> arguments, Function<List<Value>, Outcome> body) {
        Outcome outcome = body.apply(arguments);
        if (outcome.slips().isEmpty() || !arguments.contains(Quantity.LITERAL)) {
            return outcome;
        }
        return body.apply(arguments.stream()
                .map(value -> value.equals(Quantity.LITERAL) ? Quantity.ANY : value)
                .toList());
    }
}
