package sill.values;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A worksheet value as plain data. */
public sealed interface Datum {
    /** A {@code double} or {@code float}. */
    record Real(double value) implements Datum {}

    /** An integer of any width, written in decimal. */
    record Whole(String digits) implements Datum {}

    record Truth(boolean value) implements Datum {}

    /** A text, a character, an enum constant. */
    record Text(String value) implements Datum {}

    /** No value. */
    record Absent() implements Datum {}

    /**
     * An array, list, set or stream of values in order.
     *
     * @param size how many there are; {@code items} may hold only the first of them
     */
    record Items(List<Datum> items, int size) implements Datum {
        public Items {
            items = List.copyOf(items);
        }
    }

    /** A record's components, or a map's entries with the keys as text. */
    record Fields(Map<String, Datum> fields) implements Datum {
        public Fields {
            fields = Collections.unmodifiableMap(new LinkedHashMap<>(fields));
        }
    }

    /** Anything else, by its own text. */
    record Opaque(String text) implements Datum {}
}
