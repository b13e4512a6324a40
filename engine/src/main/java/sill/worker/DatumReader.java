package sill.worker;

import java.lang.reflect.Array;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.RecordComponent;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.OptionalLong;
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
        try {
            return new DatumReader().datum(value, type, 0);
        } catch (RuntimeException | StackOverflowError e) {
            // A worksheet's own collection may throw where the JDK's do not.
            return new Datum.Opaque(unreadable(type, e));
        }
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
        } else if (value instanceof OptionalDouble optional) {
            return optional.isEmpty() ? new Datum.Absent() : new Datum.Real(optional.getAsDouble());
        } else if (value instanceof OptionalInt optional) {
            return optional.isEmpty() ? new Datum.Absent() : new Datum.Whole(String.valueOf(optional.getAsInt()));
        } else if (value instanceof OptionalLong optional) {
            return optional.isEmpty() ? new Datum.Absent() : new Datum.Whole(String.valueOf(optional.getAsLong()));
        } else if (value instanceof Map.Entry<?, ?> entry) {
            Map<String, Datum> parts = new LinkedHashMap<>();
            parts.put("key", datum(entry.getKey(), "Object", depth + 1));
            parts.put("value", datum(entry.getValue(), "Object", depth + 1));
            return new Datum.Fields(parts);
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
        for (Object item : StableOrder.of(collection)) {
            if (items++ >= MOST_ITEMS) {
                break;
            }
            read.add(datum(item, "Object", depth + 1));
        }
        return new Datum.Items(read, collection.size());
    }

    private Datum map(Map<?, ?> map, int depth) {
        Map<String, Datum> read = new LinkedHashMap<>();
        for (Object key : StableOrder.of(map)) {
            if (items++ >= MOST_ITEMS) {
                break;
            }
            read.put(ownText(key, "key"), datum(map.get(key), "Object", depth + 1));
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
            String type = component.getType().getSimpleName();
            try {
                Method accessor = component.getAccessor();
                accessor.setAccessible(true);
                read.put(component.getName(), datum(accessor.invoke(value), type, depth + 1));
            } catch (InvocationTargetException e) {
                read.put(component.getName(), new Datum.Opaque(unreadable(type, e.getCause())));
            } catch (ReflectiveOperationException e) {
                read.put(component.getName(), new Datum.Opaque(unreadable(type, e)));
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
        } catch (ReflectiveOperationException | RuntimeException | StackOverflowError | AssertionError e) {
            return unreadable(type, e);
        }
    }

    private static String unreadable(String type, Throwable thrown) {
        return type + ", which can't be shown: " + thrown.getClass().getSimpleName();
    }

    private static String cut(String text) {
        return text.length() <= LONGEST_TEXT ? text : text.substring(0, LONGEST_TEXT) + "…";
    }
}
