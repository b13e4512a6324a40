package sill.worker;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sill.values.Datum;
import sill.words.Quoted;
import sill.worksheet.Problem;

/** What values were when their cells ended, to find those that a later cell changed from inside. */
final class Snapshots {
    private final Map<String, Kept> kept = new LinkedHashMap<>();

    private record Kept(int cell, int line, byte[] then) {}

    /** Keeps a settled value, unless its kind can't change from inside. */
    void keep(String name, int cell, int line, Object value, Datum then) {
        boolean fixed = then instanceof Datum.Real
                || then instanceof Datum.Whole
                || then instanceof Datum.Truth
                || then instanceof Datum.Absent
                || value instanceof String;
        if (!fixed) {
            kept.put(name, new Kept(cell, line, digest(then)));
        }
    }

    /** A problem for each value that is no longer what it was. */
    List<Problem> problems(Class<?> code) throws ReflectiveOperationException {
        List<Problem> problems = new ArrayList<>();
        for (Map.Entry<String, Kept> entry : kept.entrySet()) {
            Kept before = entry.getValue();
            Datum now = DatumReader.read(code.getField(entry.getKey()).get(null), "");
            if (!Arrays.equals(digest(now), before.then()) && !(now instanceof Datum.Opaque)) {
                problems.add(Problem.error(
                        before.line(),
                        1,
                        before.cell(),
                        "Found " + Quoted.of(entry.getKey()) + " altered from inside, expected it to stay as cell "
                                + before.cell() + " settled it",
                        mend(entry.getKey(), code.getField(entry.getKey()).getType())));
            }
        }
        return problems;
    }

    private static String mend(String name, Class<?> type) {
        if (type.isArray()) {
            return "Alter a copy: '" + name + ".clone()'.";
        } else if (Collection.class.isAssignableFrom(type)) {
            return "Alter a copy: 'new ArrayList<>(" + name + ")'.";
        }
        return Map.class.isAssignableFrom(type) ? "Alter a copy: 'new TreeMap<>(" + name + ")'." : "Alter a copy.";
    }

    /** Of one length for any value, since a run may settle more than it could keep twice. */
    private static byte[] digest(Datum datum) {
        try {
            return MessageDigest.getInstance("SHA-256").digest(ValueWire.bytes(datum));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
