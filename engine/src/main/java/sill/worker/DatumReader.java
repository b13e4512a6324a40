package sill.worker;

import java.lang.reflect.Array;
import java.lang.reflect.Method;
import java.lang.reflect.RecordComponent;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import sill.stdlib.Plot;
import sill.stdlib.Table;
import sill.values.Datum;

/** Turns what a cell computed into plain data, within limits of depth, size and text. */
final class DatumReader {
    private static final int DEEPEST = 8;
    private static final int MOST_ITEMS = 200_000;
    private static final int LONGEST_TEXT = 20_000;

    private int items;

    private DatumReader() {}

    /**
     * The value as data.
     *
     * @param type its declared type, said when the value has no text of its own
     */
    static Datum read(Object value, String type) {
        return new DatumReader().datum(value, type, 0);
    }

    private Datum datum(Object value, String type, int depth) {
        if (value == null) {
            return new Datum.Absent();
        } else if (value instanceof Double || value instanceof Float) {
            return new Datum.Real(((Number) value).doubleValue());
        } else if (value instanceof Integer
                || value instanceof Long
                || value instanceof Short
                || value instanceof Byte
                || value instanceof BigInteger) {
            return new Datum.Whole(value.toString());
        } else if (value instanceof Boolean truth) {
            return new Datum.Truth(truth);
        } else if (value instanceof CharSequence || value instanceof Character) {
            return new Datum.Text(cut(value.toString()));
        } else if (value instanceof Enum<?> constant) {
            return new Datum.Text(constant.name());
        } else if (value instanceof Plot plot) {
            return new Datum.Opaque("plot: " + cut(plot.title()));
        } else if (depth >= DEEPEST) {
            return new Datum.Opaque("…");
        }
        return structure(value, type, depth);
    }

    private Datum structure(Object value, String type, int depth) {
        if (value instanceof Optional<?> optional) {
            return datum(optional.orElse(null), "Object", depth + 1);
        } else if (value.getClass().isArray()) {
            return array(value, depth);
        } else if (value instanceof Map<?, ?> map) {
            return map(map, depth);
        } else if (value instanceof Collection<?> collection) {
            return collection(collection, depth);
        } else if (value instanceof Table table) {
            return table(table, depth);
        } else if (value instanceof Record) {
            return components((Record) value, depth);
        }
        return new Datum.Opaque(ownText(value, type));
    }

    private Datum array(Object array, int depth) {
        int size = Array.getLength(array);
        List<Datum> read = new ArrayList<>();
        for (int i = 0; i < size && items++ < MOST_ITEMS; i++) {
            read.add(datum(Array.get(array, i), "Object", depth + 1));
        }
        return new Datum.Items(read, size);
    }

    private Datum collection(Collection<?> collection, int depth) {
        List<Datum> read = new ArrayList<>();
        for (Object item : collection) {
            if (items++ >= MOST_ITEMS) {
                break;
            }
            read.add(datum(item, "Object", depth + 1));
        }
        boolean ordered =
                !(collection instanceof Set) || collection instanceof SortedSet || collection instanceof LinkedHashSet;
        if (!ordered) {
            // A hash set's order is an accident that a re-run need not repeat.
            read.sort(java.util.Comparator.comparing(Datum::toString));
        }
        return new Datum.Items(read, collection.size());
    }

    private Datum map(Map<?, ?> map, int depth) {
        boolean ordered = map instanceof SortedMap || map instanceof LinkedHashMap;
        Map<String, Datum> read = ordered ? new LinkedHashMap<>() : new TreeMap<>();
        for (Map.Entry<?, ?> entry : map.entrySet()) {
            if (items++ >= MOST_ITEMS) {
                break;
            }
            read.put(ownText(entry.getKey(), "key"), datum(entry.getValue(), "Object", depth + 1));
        }
        return new Datum.Fields(read);
    }

    private Datum table(Table table, int depth) {
        Map<String, Datum> read = new LinkedHashMap<>();
        table.numberColumns().forEach(name -> read.put(name, array(table.column(name), depth + 1)));
        table.textColumns().forEach(name -> read.put(name, collection(table.text(name), depth + 1)));
        return new Datum.Fields(read);
    }

    private Datum components(Record value, int depth) {
        Map<String, Datum> read = new LinkedHashMap<>();
        for (RecordComponent component : value.getClass().getRecordComponents()) {
            try {
                Method accessor = component.getAccessor();
                accessor.setAccessible(true);
                read.put(
                        component.getName(),
                        datum(accessor.invoke(value), component.getType().getSimpleName(), depth + 1));
            } catch (ReflectiveOperationException | RuntimeException e) {
                read.put(component.getName(), new Datum.Opaque("not readable"));
            }
        }
        return new Datum.Fields(read);
    }

    /** Its own text; its type when it has none but the one that shows an address in memory. */
    private static String ownText(Object value, String type) {
        if (value == null) {
            return "null";
        }
        try {
            boolean inherited = value.getClass().getMethod("toString").getDeclaringClass() == Object.class;
            return inherited ? type : cut(String.valueOf(value.toString()));
        } catch (ReflectiveOperationException | RuntimeException e) {
            return type;
        }
    }

    private static String cut(String text) {
        return text.length() <= LONGEST_TEXT ? text : text.substring(0, LONGEST_TEXT) + "…";
    }
}
