package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.sheet.Slice;
import sill.sheet.TranslatedSheet.ResultField;
import sill.values.Datum;
import sill.values.Result;

/**
 * A number that a tolerance cell studies: an expression's value, or one component of a record.
 *
 * @param index place of the expression in the cell, from 1
 * @param of the expression
 * @param component the component of a record; empty for a number
 * @param unit coherent SI unit symbol; empty when unknown
 * @param shownIn the unit that its variable's caption asks for; empty when none
 * @param nominal what the cells gave
 */
record StudyTarget(int cell, int index, String of, String component, String unit, String shownIn, double nominal) {
    /** What an expression's nominal value has to study: one number, or a record's; nothing when it is neither. */
    static List<StudyTarget> of(Result result, String shownIn) {
        Optional<Double> number = number(result.value());
        if (number.isPresent()) {
            return List.of(new StudyTarget(
                    result.cell(), result.index(), result.formula(), "", result.unit(), shownIn, number.get()));
        }
        List<StudyTarget> targets = new ArrayList<>();
        if (result.value() instanceof Datum.Fields fields) {
            for (Map.Entry<String, Datum> component : fields.fields().entrySet()) {
                Optional<Double> value = number(component.getValue());
                if (value.isEmpty()) {
                    return List.of();
                }
                String unit = result.componentUnits().getOrDefault(component.getKey(), result.unit());
                targets.add(new StudyTarget(
                        result.cell(),
                        result.index(),
                        result.formula(),
                        component.getKey(),
                        unit,
                        shownIn,
                        value.get()));
            }
        }
        return targets;
    }

    private static Optional<Double> number(Datum value) {
        if (value instanceof Datum.Real real) {
            return Optional.of(real.value());
        }
        return value instanceof Datum.Whole whole ? Optional.of(Double.valueOf(whole.digits())) : Optional.empty();
    }

    /** What it is called: the expression, with a component behind a point. */
    String name() {
        return component.isEmpty() ? of : of + "." + component;
    }

    /** What the slice is to give for an expression with these targets. */
    static Slice.Output output(ResultField field, List<StudyTarget> targets) {
        List<String> components = targets.stream()
                .map(StudyTarget::component)
                .filter(name -> !name.isEmpty())
                .toList();
        return new Slice.Output(field.field(), components);
    }
}
