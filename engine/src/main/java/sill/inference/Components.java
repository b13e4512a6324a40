package sill.inference;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A value in parts.
 *
 * @param parts of a record by their names; of a map or a map's entry its {@link #KEY} and {@link #VALUE}
 */
record Components(Map<String, Value> parts, boolean ofMap) implements Value {
    static final String KEY = "key";
    static final String VALUE = "value";

    /** Deeper records are unknown, so that a list linked by hand has an end. */
    private static final int DEEPEST = 4;

    Components {
        Map<String, Value> shallow = new LinkedHashMap<>();
        parts.forEach((name, part) -> shallow.put(name, depth(part) >= DEEPEST ? Quantity.UNKNOWN : part));
        parts = shallow;
    }

    /** A record. */
    Components(Map<String, Value> parts) {
        this(parts, false);
    }

    static Components entry(Value key, Value value) {
        Map<String, Value> parts = new LinkedHashMap<>();
        parts.put(KEY, key);
        parts.put(VALUE, value);
        return new Components(parts, true);
    }

    Value part(String name) {
        return parts.getOrDefault(name, Quantity.UNKNOWN);
    }

    Value join(Components other) {
        if (ofMap != other.ofMap || !parts.keySet().equals(other.parts.keySet())) {
            return Quantity.UNKNOWN;
        }
        Map<String, Value> joined = new LinkedHashMap<>();
        parts.forEach((name, part) -> joined.put(name, Value.join(part, other.part(name))));
        return new Components(joined, ofMap);
    }

    private static int depth(Value value) {
        if (value instanceof Components components) {
            return 1
                    + components.parts.values().stream()
                            .mapToInt(Components::depth)
                            .max()
                            .orElse(0);
        }
        return 0;
    }
}
