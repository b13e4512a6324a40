package sill.values;

import java.util.List;

/**
 * What a check line's expression gave at the nominal values.
 *
 * @param line the check's line in the worksheet
 * @param value the number or boolean
 * @param unit coherent SI unit symbol; empty when unknown
 * @param uses names in the expression
 * @param dependsOn all names it rests on, down to the givens
 */
public record CheckValue(int line, Datum value, String unit, List<String> uses, List<String> dependsOn) {
    public CheckValue {
        uses = List.copyOf(uses);
        dependsOn = List.copyOf(dependsOn);
    }
}
