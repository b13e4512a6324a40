package sill.study;

import java.util.List;

/**
 * An extreme of a result.
 *
 * @param value the result there
 * @param at the point, an input each in the order of the plan
 * @param inside whether an input on which the result depends lies between its limits there: the extreme is a peak, not at a
 *     corner
 */
public record Extreme(double value, List<Setting> at, boolean inside) {
    public Extreme {
        at = List.copyOf(at);
    }
}
