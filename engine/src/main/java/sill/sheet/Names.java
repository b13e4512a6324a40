package sill.sheet;

import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import sill.words.Quoted;
import sill.worksheet.Problem;

/** One name, one meaning: who declares what, and who tries to declare it again. The first declaration stays in force. */
final class Names {
    private final Map<String, Declaration> declarations = new LinkedHashMap<>();
    private final Set<Snippet> again = Collections.newSetFromMap(new IdentityHashMap<>());
    private final List<Problem> problems = new ArrayList<>();

    /** What a name stands for. */
    enum Kind {
        GIVEN("given"),
        RESULT("result"),
        /** Of Java that can't be parsed. */
        LOST("name"),
        METHOD("method"),
        TYPE("type");

        final String word;

        Kind(String word) {
            this.word = word;
        }
    }

    /**
     * A declaration.
     *
     * @param name the name; a bare expression's field has one too
     * @param snippet where it is declared; null for a given or a lost name
     * @param offset offset of the name in its piece
     */
    record Declaration(String name, Kind kind, int cell, int line, Snippet snippet, int offset) {
        boolean isMember() {
            return kind == Kind.METHOD || kind == Kind.TYPE;
        }

        /** As messages call it, as in {@code given on line 9}. */
        String where() {
            return kind.word + " on line " + line;
        }
    }

    static Names of(Program program) {
        Names names = new Names();
        for (SheetSource.GivenField given : program.givens()) {
            names.declarations.put(
                    given.name(), new Declaration(given.name(), Kind.GIVEN, given.cell(), given.line(), null, 0));
        }
        program.cells().forEach(names::add);
        // Last, since a name that is surely declared counts before one that probably is.
        program.cells().forEach(names::addLost);
        return names;
    }

    /** All declarations in force, by name, in order. */
    Map<String, Declaration> declarations() {
        return declarations;
    }

    /** The snippets that declare what is declared already. */
    Set<Snippet> again() {
        return again;
    }

    /** Second declarations, each a problem of its cell. */
    List<Problem> problems() {
        return problems;
    }

    private void add(Program.CellCode cell) {
        for (Snippet snippet : cell.snippets()) {
            if (snippet.isMember()) {
                Kind kind = snippet.kind() == Snippet.Kind.METHOD ? Kind.METHOD : Kind.TYPE;
                declare(snippet.name().text(), kind, snippet, snippet.name().at());
            }
            for (Snippet.Variable variable : snippet.variables()) {
                declare(variable.name(), Kind.RESULT, snippet, variable.at());
            }
        }
        for (Program.Field field : cell.fields()) {
            if (field.name().isEmpty()) {
                declare(
                        field.field(),
                        Kind.RESULT,
                        field.snippet(),
                        field.typeSpan().start());
            }
        }
    }

    private void addLost(Program.CellCode cell) {
        cell.lostNames().forEach((name, offset) -> {
            int line = cell.piece().place(offset).line();
            declarations.putIfAbsent(name, new Declaration(name, Kind.LOST, cell.number(), line, null, offset));
        });
    }

    private void declare(String name, Kind kind, Snippet snippet, int offset) {
        Place place = snippet.piece().place(offset);
        Declaration earlier = declarations.get(name);
        if (earlier == null) {
            declarations.put(name, new Declaration(name, kind, snippet.cell(), place.line(), snippet, offset));
            return;
        }
        // Overloads are one name with one meaning as long as they stand together.
        boolean overload = kind == Kind.METHOD && earlier.kind() == Kind.METHOD && earlier.cell() == snippet.cell();
        if (!overload) {
            again.add(snippet);
            problems.add(Problem.error(
                    place.line(),
                    place.column(),
                    snippet.cell(),
                    snippet.piece().where() + ": found " + Quoted.of(name)
                            + " declared again, expected a new name; it is the " + earlier.where(),
                    "One name has one meaning in a worksheet. Choose another name."));
        }
    }
}
