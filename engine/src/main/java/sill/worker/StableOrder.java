package sill.worker;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;
import java.util.SortedSet;

/** An order that a re-run repeats: a hash's own order is an accident, which some of the JDK's collections vary on purpose. */
final class StableOrder {
    private StableOrder() {}

    /** The items, in the collection's own order when it has one. */
    static List<?> of(Collection<?> collection) {
        // An enum's set can't be told by its class's name, but sorts as it is.
        boolean ordered =
                !(collection instanceof Set) || collection instanceof SortedSet || collection instanceof LinkedHashSet;
        return ordered ? new ArrayList<>(collection) : sorted(collection);
    }

    /** The keys, in the map's own order when it has one. */
    static List<?> of(Map<?, ?> map) {
        boolean ordered = map instanceof SortedMap || map instanceof LinkedHashMap || map instanceof EnumMap;
        return ordered ? new ArrayList<>(map.keySet()) : sorted(map.keySet());
    }

    private static List<?> sorted(Collection<?> items) {
        List<Object> sorted = new ArrayList<>(items);
        sorted.sort(alike(sorted) ? StableOrder::natural : Comparator.comparing(StableOrder::text));
        return sorted;
    }

    private static boolean alike(List<Object> items) {
        return items.stream()
                                .map(item ->
                                        item instanceof Enum<?> constant ? constant.getDeclaringClass() : classOf(item))
                                .distinct()
                                .count()
                        == 1
                && items.get(0) instanceof Comparable;
    }

    private static Class<?> classOf(Object item) {
        return item == null ? Void.class : item.getClass();
    }

    /** Of one class, as {@link #alike} saw. */
    @SuppressWarnings("unchecked")
    private static int natural(Object a, Object b) {
        return ((Comparable<Object>) a).compareTo(b);
    }

    /** As the record shows it, since the item's own text may hold an address. */
    private static String text(Object item) {
        return DatumReader.read(item, "").toString();
    }
}
