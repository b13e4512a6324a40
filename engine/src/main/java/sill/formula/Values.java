package sill.formula;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sill.units.PrintedQuantity;

/** What is known of the values of a sheet, and how its record prints them. */
public interface Values {
    /**
     * What stands in a name's place where the numbers are put in: {@link Expression.Shown} or {@link Expression.Truth}.
     *
     * @param path components and indices that lead into the value; empty for the value itself
     * @param digits significant digits of a computed number; one that the author typed has all of its own
     * @return empty when it is no number and no truth value
     */
    Optional<Expression> inPlaceOf(String name, List<String> path, int digits);

    /**
     * A computed number.
     *
     * @param unit coherent SI unit symbol; empty when unknown
     */
    PrintedQuantity quantity(double si, String unit, int digits);

    /** The value of a call without a form; empty when only the sheet itself can tell. */
    OptionalDouble value(Expression.Call call, List<Double> arguments);
}
