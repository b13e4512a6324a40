package sill.record;

import sill.units.Unit;
import sill.units.UnitException;

/** Unit symbols that the engine or a helper wrote, as units. */
final class Units {
    private Units() {}

    /** The unit of a symbol; that of a pure number when the symbol is empty or none of ours. */
    static Unit of(String symbol) {
        try {
            return symbol.isEmpty() ? Unit.ONE : Unit.parse(symbol);
        } catch (UnitException e) {
            return Unit.ONE;
        }
    }

    /** The same unit with nothing to print: for numbers whose unit stands once for all of them. */
    static Unit withoutSymbol(Unit unit) {
        return new Unit("1", unit.dimension(), unit.factor(), unit.offset());
    }
}
