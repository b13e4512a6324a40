package sill.record;

import java.util.List;
import sill.stdlib.Plot.Axis;
import sill.stdlib.Plot.Scale;
import sill.units.Unit;
import sill.values.Finding;

/**
 * An axis of a drawing over tolerances. Axes are in coherent units, whose prefix the drawing chooses; one of temperatures in
 * °C has their numbers, and its label tells.
 */
final class AxisOf {
    private final String name;
    private final Unit unit;

    AxisOf(String name, Unit unit) {
        this.name = name;
        this.unit = unit;
    }

    /** An axis of what a finding is about. */
    static AxisOf result(Finding finding) {
        Unit asked = Units.of(finding.shownIn());
        return new AxisOf(finding.name(), asked.offset() == 0 ? Units.of(finding.unit()) : asked);
    }

    Axis axis() {
        return unit.offset() == 0
                ? new Axis(name, unit.coherent().symbol(), Scale.LINEAR)
                : new Axis(name + " in " + unit.symbol(), "1", Scale.LINEAR);
    }

    double number(double si) {
        return unit.offset() == 0 ? si : unit.fromSi(si);
    }

    double[] numbers(List<Double> si) {
        return si.stream().mapToDouble(this::number).toArray();
    }
}
