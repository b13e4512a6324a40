package sill.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Writes the class whose attribution gives the types that {@code var} leaves open. It differs from the
 * sheet's class in two ways: all cells are one method, where a result of open type is a local; and methods have no bodies,
 * since only their headings matter here. What the compiler complains of in it does not count.
 */
final class ProbeText {
    private static final String NO_BODY = "{ throw null; }";

    private final Program program;
    private final Map<String, String> types;
    private final MappedText text = new MappedText();
    private final Map<Integer, String> slots = new HashMap<>();

    ProbeText(Program program, Map<String, String> types) {
        this.program = program;
        this.types = types;
    }

    /** The offset of the statement that tells an open field's type, to the field. */
    Map<Integer, String> slots() {
        return slots;
    }

    /** The compilation unit. */
    String unit() {
        Translation.IMPORTS.forEach(name -> text.add("import " + name + ";\n"));
        each(Snippet.Kind.IMPORT).forEach(s -> text.copy(s.piece(), s.span()).add(s.isWhole() ? "\n" : ";\n"));
        text.add("class " + ClassText.NAME + " {\n");
        Set<String> names = new HashSet<>();
        for (SheetSource.GivenField given : program.presentGivens()) {
            text.add("static " + given.type().java() + " " + given.name() + ";\n");
            names.add(given.name());
        }
        for (Program.CellCode cell : program.cells()) {
            for (Program.Field field : cell.fields()) {
                String type = field.isOpen() ? types.getOrDefault(field.field(), "") : field.type();
                if (!type.isEmpty() && !type.equals(ClassText.NO_VALUE) && names.add(field.field())) {
                    text.add("static " + type + " " + field.field() + ";\n");
                }
            }
        }
        each(Snippet.Kind.METHOD).forEach(this::heading);
        each(Snippet.Kind.TYPE).forEach(this::heading);
        text.add("static void all() throws Throwable {\n");
        for (Program.CellCode cell : program.cells()) {
            for (Program.Field field : cell.fields()) {
                if (field.isOpen() && !field.isBare() && !types.containsKey(field.field())) {
                    open(field);
                }
            }
        }
        return text.add("}\n}\n").toString();
    }

    private List<Snippet> each(Snippet.Kind kind) {
        List<Snippet> found = new ArrayList<>();
        for (Program.CellCode cell : program.cells()) {
            cell.snippets().stream().filter(s -> s.kind() == kind).forEach(found::add);
        }
        return found;
    }

    private void heading(Snippet snippet) {
        text.add(snippet.isStatic() ? "" : "static ");
        int from = snippet.span().start();
        for (Span body : snippet.bodies()) {
            text.copy(snippet.piece(), new Span(from, body.start())).add(NO_BODY);
            from = body.end();
        }
        text.copy(snippet.piece(), new Span(from, snippet.span().end())).add("\n");
    }

    private void open(Program.Field field) {
        Snippet snippet = field.snippet();
        slots.put(text.length(), field.field());
        Span value = snippet.variables().stream()
                .filter(variable -> variable.name().equals(field.name()))
                .findFirst()
                .orElseThrow()
                .initialiser();
        text.add("var " + field.field() + " = ").copy(snippet.piece(), value).add(";\n");
    }
}
