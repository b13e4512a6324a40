package sill.values;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.formula.Expression;
import sill.stdlib.Plot;

/**
 * One result of a calculation cell: a top-level variable, or the value of a bare expression.
 *
 * @param name the variable's name; empty for a bare expression
 * @param cell number of its cell
 * @param index its place among the cell's results, from 1
 * @param line its line in the worksheet
 * @param formula the Java it comes from, as one line: the initialiser, or the bare expression; empty when there is none
 * @param type its Java type, without packages
 * @param value in coherent SI
 * @param plot the plot, when the value is one
 * @param unit coherent SI unit symbol; empty when unknown
 * @param shownIn the unit its caption asks for; empty when none
 * @param componentUnits coherent SI unit symbols of a record's components, where known
 * @param caption the trailing comment's text, without the unit
 * @param uses names it is made from directly
 * @param dependsOn all names it rests on, down to the givens
 * @param meaning what the Java means as mathematics; empty when it has none
 */
public record Result(
        String name,
        int cell,
        int index,
        int line,
        String formula,
        String type,
        Datum value,
        Optional<Plot> plot,
        String unit,
        String shownIn,
        Map<String, String> componentUnits,
        String caption,
        List<String> uses,
        List<String> dependsOn,
        Optional<Expression> meaning) {
    public Result {
        // Map.copyOf would forget the order of the components.
        componentUnits = Collections.unmodifiableMap(new LinkedHashMap<>(componentUnits));
        uses = List.copyOf(uses);
        dependsOn = List.copyOf(dependsOn);
    }

    /** What a reviewer quotes: cell, full stop, place in the cell. */
    public String address() {
        return cell + "." + index;
    }
}
