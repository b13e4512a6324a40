package sill.formula;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sill.units.Notation;
import sill.units.PrintedQuantity;
import sill.units.Unit;

/** Values of which none is known: all names stay. */
enum Symbols implements Values {
    ONLY;

    @Override
    public Optional<Expression> inPlaceOf(String name, List<String> path, int digits) {
        return Optional.empty();
    }

    @Override
    public PrintedQuantity quantity(double si, String unit, int digits) {
        return Notation.printed(si, Unit.ONE, digits);
    }

    @Override
    public OptionalDouble value(Expression.Call call, List<Double> arguments) {
        return OptionalDouble.empty();
    }
}
