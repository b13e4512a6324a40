package sill.sheet;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Deque;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;

/**
 * What every name rests on. A value is made from the names read where it is assigned or altered; a method or type hands on
 * the names its own text reads. All lists are in the order of the declarations.
 */
final class Dependencies {
    private final Map<String, Names.Declaration> declarations;
    private final Map<String, Integer> order = new HashMap<>();
    private final Map<Snippet, List<Usage>> usages = new IdentityHashMap<>();
    private final Map<String, Set<String>> memberReads = new HashMap<>();
    private final Map<String, Set<String>> uses = new LinkedHashMap<>();

    Dependencies(Program program, Names names, List<Usage> all, SnippetFinder snippets) {
        declarations = names.declarations();
        declarations.keySet().forEach(name -> order.put(name, order.size()));
        group(all, snippets);
        readMembers(program);
        followWrites();
    }

    /** The values a result is made from directly. */
    List<String> uses(String result) {
        return List.copyOf(uses.getOrDefault(result, Set.of()));
    }

    /** The values a snippet reads. */
    List<String> readBy(Snippet snippet) {
        return List.copyOf(reads(snippet, snippet.span()));
    }

    /** All names that some values rest on, themselves included. */
    List<String> closure(Collection<String> values) {
        return List.copyOf(reachable(values, name -> uses.getOrDefault(name, Set.of())));
    }

    /** The names of other cells that a snippet mentions: values, methods, types. */
    List<String> needs(Snippet snippet) {
        Set<String> needed = inOrder();
        for (Usage usage : usages(snippet)) {
            if (declarations.get(usage.name()).cell() != snippet.cell()) {
                needed.add(usage.name());
            }
        }
        return List.copyOf(needed);
    }

    /** Names in the order of their declarations. */
    Set<String> inOrder(Collection<String> names) {
        Set<String> sorted = inOrder();
        sorted.addAll(names);
        return sorted;
    }

    private Set<String> inOrder() {
        return new TreeSet<>((a, b) -> Integer.compare(order.get(a), order.get(b)));
    }

    /** Where a snippet uses the names of the sheet. */
    List<Usage> usages(Snippet snippet) {
        return usages.getOrDefault(snippet, List.of());
    }

    private void group(List<Usage> all, SnippetFinder snippets) {
        for (Usage usage : all) {
            if (declarations.containsKey(usage.name())) {
                snippets.at(usage.piece(), usage.offset())
                        .ifPresent(snippet -> usages.computeIfAbsent(snippet, each -> new ArrayList<>())
                                .add(usage));
            }
        }
    }

    /** Overloads share a name, and here what they read. */
    private void readMembers(Program program) {
        Map<String, Set<String>> mentioned = new HashMap<>();
        for (Program.CellCode cell : program.cells()) {
            for (Snippet snippet : cell.snippets()) {
                if (snippet.isMember()) {
                    Set<String> names = mentioned.computeIfAbsent(snippet.name().text(), name -> inOrder());
                    usages(snippet).forEach(usage -> names.add(usage.name()));
                }
            }
        }
        for (String member : mentioned.keySet()) {
            Set<String> read = reachable(List.of(member), name -> mentioned.getOrDefault(name, Set.of()));
            read.removeIf(name -> declarations.get(name).isMember());
            memberReads.put(member, read);
        }
    }

    private void followWrites() {
        for (Names.Declaration result : declarations.values()) {
            if (result.kind() == Names.Kind.RESULT) {
                uses.put(result.name(), reads(result.snippet(), initialiser(result)));
            }
        }
        usages.forEach((snippet, within) -> {
            for (Usage usage : within) {
                Names.Declaration target = declarations.get(usage.name());
                boolean writes = usage.kind() == Usage.Kind.VALUE && usage.how() != Usage.How.READ;
                if (writes && target.kind() == Names.Kind.RESULT && target.snippet() != snippet) {
                    uses.get(usage.name()).addAll(reads(snippet, snippet.span()));
                }
            }
        });
        uses.forEach((name, made) -> made.remove(name));
    }

    private Set<String> reads(Snippet snippet, Span within) {
        Set<String> read = inOrder();
        for (Usage usage : usages(snippet)) {
            if (usage.offset() < within.start() || usage.offset() >= within.end()) {
                continue;
            }
            if (usage.kind() != Usage.Kind.VALUE) {
                read.addAll(memberReads.getOrDefault(usage.name(), Set.of()));
            } else if (usage.how() != Usage.How.ASSIGNED) {
                read.add(usage.name());
            }
        }
        return read;
    }

    private Set<String> reachable(Collection<String> from, Function<String, Set<String>> next) {
        Set<String> seen = inOrder();
        Deque<String> open = new ArrayDeque<>(from);
        while (!open.isEmpty()) {
            String name = open.pop();
            if (seen.add(name)) {
                open.addAll(next.apply(name));
            }
        }
        return seen;
    }

    private static Span initialiser(Names.Declaration result) {
        return result.snippet().variables().stream()
                .filter(variable -> variable.name().equals(result.name()))
                .findFirst()
                .map(Snippet.Variable::initialiser)
                .orElse(result.snippet().expression());
    }
}
