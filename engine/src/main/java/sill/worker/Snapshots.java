package sill.worker;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sill.values.Datum;
import sill.worksheet.Problem;

/** What values were when their cells ended, to find those that a later cell changed from inside. */
final class Snapshots {
    private final Map<String, Kept> kept = new LinkedHashMap<>();

    private record Kept(int cell, int line, Datum then) {}

    /** Keeps a settled value, unless its kind can't change from inside. */
    void keep(String name, int cell, int line, Object value, Datum then) {
        boolean fixed = then instanceof Datum.Real
                || then instanceof Datum.Whole
                || then instanceof Datum.Truth
                || then instanceof Datum.Absent
                || value instanceof String;
        if (!fixed) {
            kept.put(name, new Kept(cell, line, then));
        }
    }

    /** A problem for each value that is no longer what it was. */
    List<Problem> problems(Class<?> code) throws ReflectiveOperationException {
        List<Problem> problems = new ArrayList<>();
        for (Map.Entry<String, Kept> entry : kept.entrySet()) {
            Kept before = entry.getValue();
            Datum now = DatumReader.read(code.getField(entry.getKey()).get(null), "");
            if (!now.equals(before.then()) && !(now instanceof Datum.Opaque)) {
                problems.add(Problem.error(
                        before.line(),
                        1,
                        before.cell(),
                        "\"" + entry.getKey() + "\" was changed from inside after cell " + before.cell()
                                + " had settled it",
                        "change a copy: \"" + entry.getKey() + ".clone()\" for an array, \"new ArrayList<>("
                                + entry.getKey() + ")\" for a list"));
            }
        }
        return problems;
    }
}
