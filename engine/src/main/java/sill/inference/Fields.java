package sill.inference;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import javax.lang.model.element.Element;
import sill.units.Unit;

/** What is known of the sheet's fields: its givens and results. */
final class Fields {
    private final Seeds seeds;
    private final Map<Element, Value> values = new HashMap<>();
    private final Map<String, Value> byName = new HashMap<>();
    private int changes;

    Fields(Seeds seeds) {
        this.seeds = seeds;
    }

    Value get(Element field) {
        Value value = values.get(field);
        if (value != null) {
            return value;
        }
        Seeds.GivenValue given = seeds.givens().get(name(field));
        return given == null
                ? Quantity.UNKNOWN
                : given.dimension().<Value>map(Quantity::of).orElse(Quantity.UNKNOWN);
    }

    /** What a statement of the sheet shows, under the name of the field it will be kept in. */
    void show(String field, Value value) {
        byName.put(field, value);
    }

    boolean isSet(Element field) {
        return values.containsKey(field);
    }

    void set(Element field, Value value) {
        Value before = values.put(field, value);
        byName.put(name(field), value);
        if (before != null && !before.equals(value)) {
            changes++;
        }
    }

    /** The unit that a field's caption states. */
    Optional<Unit> stated(String field) {
        return Optional.ofNullable(seeds.stated().get(field));
    }

    /** The field that a statement gives its first value; empty when it is no such statement. */
    Optional<String> slot(int offset) {
        return Optional.ofNullable(seeds.slots().get(offset));
    }

    /** How often a field that had a value got another one. */
    int changes() {
        return changes;
    }

    /** What is known at the end, by name. */
    Map<String, Value> byName() {
        return byName;
    }

    static String name(Element field) {
        return field.getSimpleName().toString();
    }
}
