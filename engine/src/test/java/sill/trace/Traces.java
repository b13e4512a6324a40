package sill.trace;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.Set;

/** Traces for tests, written as {@code result c = a b}: kind, name, names used. */
final class Traces {
    private Traces() {}

    static Trace of(String... lines) {
        List<TraceNode> nodes = new ArrayList<>();
        List<Set<String>> closures = new ArrayList<>();
        List<String> names = new ArrayList<>();
        for (String line : lines) {
            String[] words = line.replace("= ", "").split(" ");
            Set<String> uses = new LinkedHashSet<>(List.of(words).subList(2, words.length));
            Set<String> all = new LinkedHashSet<>(uses);
            uses.stream().filter(names::contains).forEach(name -> all.addAll(closures.get(names.indexOf(name))));
            TraceKind kind = TraceKind.valueOf(words[0].toUpperCase(Locale.ROOT));
            String at = "1." + (nodes.size() + 1);
            boolean named = kind == TraceKind.GIVEN || kind == TraceKind.RESULT;
            nodes.add(new TraceNode(
                    kind, at, named ? words[1] : "", words[1], "1.5 V", List.copyOf(uses), List.copyOf(all)));
            names.add(words[1]);
            closures.add(all);
        }
        return Trace.of(nodes);
    }

    /** A made-up sheet: a third givens, then results from two to four earlier names, at last some checks. */
    static Trace ofSize(int size, long seed) {
        Random random = new Random(seed);
        String[] lines = new String[size];
        for (int i = 0; i < size; i++) {
            StringBuilder line = new StringBuilder();
            if (i < Math.max(1, size / 3)) {
                line.append("given n").append(i);
            } else if (i < size - size / 8) {
                line.append("result n").append(i).append(" =");
                Set<Integer> uses = new LinkedHashSet<>();
                int count = Math.min(i, 2 + random.nextInt(3));
                while (uses.size() < count) {
                    // Half of what is used was made shortly before, as in a real sheet.
                    int near = Math.max(0, i - 1 - random.nextInt(6));
                    uses.add(random.nextBoolean() ? near : random.nextInt(i));
                }
                uses.forEach(use -> line.append(" n").append(use));
            } else {
                line.append("check n").append(i).append(" = n").append(size / 3 + random.nextInt(size / 2));
            }
            lines[i] = line.toString();
        }
        return of(lines);
    }
}
