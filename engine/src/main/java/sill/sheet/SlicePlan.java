package sill.sheet;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Which snippets a slice holds, and which of its values must be fields. */
final class SlicePlan {
    private static final String PLOT = "sill.stdlib.Plot";

    private final Program program;
    private final Map<String, String> types;
    private final Dependencies dependencies;
    private final Slice.Form form;
    private final int cell;
    private final Set<String> needed;
    private final List<Snippet> statements = new ArrayList<>();
    private final List<Snippet> members = new ArrayList<>();
    private final Set<String> fields = new HashSet<>();
    private final Set<String> mentioned = new HashSet<>();

    SlicePlan(
            Program program,
            Map<String, String> types,
            Dependencies dependencies,
            int cell,
            List<String> outputs,
            Slice.Form form) {
        this.program = program;
        this.types = types;
        this.dependencies = dependencies;
        this.cell = cell;
        this.form = form;
        needed = new HashSet<>(dependencies.closure(outputs));
        chooseStatements();
        List<Snippet> roots = new ArrayList<>(statements);
        program.cells().stream().filter(each -> each.number() == cell).forEach(each -> roots.addAll(each.snippets()));
        chooseMembers(roots);
        roots.forEach(snippet -> read(snippet, false));
        members.forEach(snippet -> read(snippet, true));
    }

    /** Snippets that give, or do something to, the needed values, in order. */
    List<Snippet> statements() {
        return statements;
    }

    /** Methods and types that these use. */
    List<Snippet> members() {
        return members;
    }

    /** Whether a value is needed, and so is given its value by the slice. */
    boolean isNeeded(String name) {
        return form == Slice.Form.WHOLE || needed.contains(name);
    }

    /** Whether a value must be a field: a method, a type or a lambda mentions it. */
    boolean isField(String name) {
        return form != Slice.Form.LOCALS || fields.contains(name);
    }

    /** Whether the slice's text has the name. */
    boolean isMentioned(String name) {
        return mentioned.contains(name);
    }

    private void chooseStatements() {
        for (Program.CellCode each : program.cells()) {
            if (each.number() < cell && !each.isStudy()) {
                each.snippets().stream().filter(this::isWanted).forEach(statements::add);
            }
        }
    }

    private boolean isWanted(Snippet snippet) {
        return switch (snippet.kind()) {
            case VARIABLES -> snippet.variables().stream().anyMatch(variable -> isNeeded(variable.name()));
            case STATEMENT, CALL, EXPRESSION ->
                form == Slice.Form.WHOLE ? !onlyShows(snippet) : makesSomethingNeeded(snippet);
            default -> false;
        };
    }

    private boolean makesSomethingNeeded(Snippet snippet) {
        return dependencies.usages(snippet).stream()
                .anyMatch(usage -> usage.kind() == Usage.Kind.VALUE
                        && usage.how() != Usage.How.READ
                        && needed.contains(usage.name()));
    }

    private boolean onlyShows(Snippet snippet) {
        boolean plot = program.cells().stream()
                .flatMap(each -> each.fields().stream())
                .anyMatch(field -> field.snippet() == snippet
                        && types.getOrDefault(field.field(), "").equals(PLOT));
        return plot || snippet.span().of(snippet.piece().text()).startsWith("System.out");
    }

    private void chooseMembers(List<Snippet> roots) {
        Set<String> wanted = new HashSet<>();
        Deque<Snippet> open = new ArrayDeque<>(roots);
        List<Snippet> all = program.cells().stream()
                .filter(each -> each.number() <= cell)
                .flatMap(each -> each.snippets().stream())
                .filter(Snippet::isMember)
                .toList();
        while (!open.isEmpty()) {
            for (Usage usage : dependencies.usages(open.pop())) {
                if (usage.kind() != Usage.Kind.VALUE && wanted.add(usage.name())) {
                    all.stream()
                            .filter(member -> member.name().text().equals(usage.name()))
                            .forEach(open::add);
                }
            }
        }
        all.stream()
                .filter(member -> form == Slice.Form.WHOLE
                        || wanted.contains(member.name().text()))
                .forEach(members::add);
    }

    private void read(Snippet snippet, boolean member) {
        for (Usage usage : dependencies.usages(snippet)) {
            if (usage.kind() == Usage.Kind.VALUE) {
                mentioned.add(usage.name());
                if (member || usage.deferred()) {
                    fields.add(usage.name());
                }
            }
        }
    }
}
