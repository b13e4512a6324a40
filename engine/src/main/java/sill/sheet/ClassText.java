package sill.sheet;

import java.util.HashMap;
import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Writes the one class of a sheet: givens and results are static fields, each cell is a method, each check's expression is
 * a method, the worksheet's own methods and types are members.
 */
final class ClassText {
    /** The class's simple name; a worksheet can't declare it by accident. */
    static final String NAME = "$Sheet";

    /** A method on the text's first line that tells the line the evaluator gave it. */
    static final String FIRST_LINE = "$line";

    /** What a call that gives no value has for a type. */
    static final String NO_VALUE = "void";

    private final Program program;
    private final Map<String, String> types;
    private final Set<Integer> leftOutCells;
    private final Set<Place> leftOutChecks;
    private final Set<Snippet> leftOutSnippets;
    private final Map<Snippet, Program.Field> bareExpressions = new IdentityHashMap<>();
    private final Map<Integer, String> slots = new HashMap<>();
    private final MappedText text = new MappedText();

    private ClassText(
            Program program,
            Map<String, String> types,
            Set<Integer> leftOutCells,
            Set<Place> leftOutChecks,
            Set<Snippet> leftOutSnippets) {
        this.program = program;
        this.types = types;
        this.leftOutCells = leftOutCells;
        this.leftOutChecks = leftOutChecks;
        this.leftOutSnippets = leftOutSnippets;
        for (Program.CellCode cell : program.cells()) {
            cell.fields().forEach(field -> bareExpressions.put(field.snippet(), field));
        }
    }

    /**
     * The text in which the compiler is to find all that is wrong: every cell is in it, with what could be parsed of it.
     *
     * @param types Java types of the open fields, by field name, as far as they are known
     * @param again snippets that declare what is declared already
     */
    static ClassText whole(Program program, Map<String, String> types, Set<Snippet> again) {
        return new ClassText(program, types, Set.of(), Set.of(), again);
    }

    /**
     * The text that is to run.
     *
     * @param leftOutCells numbers of the cells that can't run
     * @param leftOutChecks places of the checks that can't
     */
    static ClassText running(
            Program program, Map<String, String> types, Set<Integer> leftOutCells, Set<Place> leftOutChecks) {
        return new ClassText(program, types, leftOutCells, leftOutChecks, Set.of());
    }

    /** The imports, one a line, then the class: a compilation unit. */
    MappedText unit() {
        Translation.IMPORTS.forEach(name -> text.add("import " + name + ";\n"));
        program.imports()
                .forEach(snippet -> text.copy(snippet.piece(), snippet.span()).add(snippet.isWhole() ? "\n" : ";\n"));
        return declaration();
    }

    /** The class alone. */
    MappedText declaration() {
        text.add("public class " + NAME + " { public static int " + FIRST_LINE
                + "() { return new Throwable().getStackTrace()[0].getLineNumber(); }\n");
        fields();
        members();
        for (Program.CellCode cell : written()) {
            text.add("public static void " + cellMethod(cell.number()) + "() throws Throwable {\n");
            written(cell).forEach(this::statement);
            text.add("}\n");
        }
        for (Program.CheckCode check : program.checks()) {
            if (check.snippet().isPresent()
                    && !leftOutChecks.contains(check.line().place())) {
                check(check, check.snippet().get());
            }
        }
        return text.add("}\n");
    }

    /** Start offsets of the statements that give fields their values, to the fields' names. */
    Map<Integer, String> slots() {
        return slots;
    }

    static String cellMethod(int number) {
        return "$cell" + number;
    }

    static String checkMethod(Place place) {
        return "$check" + place.line() + "_" + place.column();
    }

    private List<Program.CellCode> written() {
        return program.cells().stream()
                .filter(cell -> !leftOutCells.contains(cell.number()))
                .toList();
    }

    private List<Snippet> written(Program.CellCode cell) {
        return cell.snippets().stream()
                .filter(snippet -> !leftOutSnippets.contains(snippet))
                .toList();
    }

    private void fields() {
        Set<String> names = new HashSet<>();
        for (SheetSource.GivenField given : program.presentGivens()) {
            text.add("public static " + given.type().java() + " " + given.name() + ";\n");
            names.add(given.name());
        }
        for (Program.CellCode cell : written()) {
            for (Program.Field field : cell.fields()) {
                String type = type(field);
                // Without a type it is a local of its cell, and what else uses it waits.
                if (!type.isEmpty() && !type.equals(NO_VALUE) && names.add(field.field())) {
                    field(field, type);
                }
            }
        }
    }

    private void field(Program.Field field, String type) {
        Piece piece = field.snippet().piece();
        text.add("public static ");
        if (!field.isOpen() && field.typeIsOnePiece()) {
            text.copy(piece, field.typeSpan());
        } else {
            text.add(type, piece, field.typeSpan().start());
        }
        text.add(" " + field.field() + ";\n");
    }

    private void members() {
        for (Program.CellCode cell : written()) {
            for (Snippet snippet : written(cell)) {
                if (snippet.isMember()) {
                    text.add(snippet.isStatic() ? "" : "static ")
                            .copy(snippet.piece(), snippet.span(), snippet.calls())
                            .add("\n");
                }
            }
        }
    }

    private void statement(Snippet snippet) {
        Piece piece = snippet.piece();
        switch (snippet.kind()) {
            case VARIABLES -> {
                for (Snippet.Variable variable : snippet.variables()) {
                    if (variable.hasInitialiser()) {
                        assignment(snippet, variable);
                    }
                }
            }
            case CALL, EXPRESSION -> value(snippet);
            case STATEMENT -> text.copy(piece, snippet.span(), snippet.calls()).add(snippet.isWhole() ? "\n" : ";\n");
            default -> {
                // Imports and members stand elsewhere in the class.
            }
        }
    }

    private void assignment(Snippet snippet, Snippet.Variable variable) {
        Piece piece = snippet.piece();
        String type = variable.typeIsOpen() ? types.getOrDefault(variable.name(), "") : variable.type();
        slots.put(text.length(), variable.name());
        // With its type unknown it stays a local, so that the compiler says why in the author's own terms.
        text.add((type.isEmpty() ? "var " : "") + variable.name() + " = ", piece, variable.at());
        if (variable.arrayInitialiser() && !type.isEmpty()) {
            text.add("new " + type, piece, variable.typeSpan().start());
        }
        text.copy(piece, variable.initialiser(), snippet.calls()).add(";\n");
    }

    private void value(Snippet snippet) {
        Piece piece = snippet.piece();
        Program.Field field = bareExpressions.get(snippet);
        Span expression = snippet.expression();
        String type = type(field);
        slots.put(text.length(), field.field());
        List<MappedText.Break> breaks = snippet.calls();
        if (type.isEmpty() && snippet.kind() == Snippet.Kind.EXPRESSION) {
            text.add("var " + field.field() + " = ", piece, expression.start());
        } else if (!type.isEmpty() && !type.equals(NO_VALUE)) {
            text.add(field.field() + " = ", piece, expression.start());
        } else {
            // The statement has to start where its slot says.
            breaks = breaks.stream()
                    .filter(next -> next.at() > expression.start())
                    .toList();
        }
        text.copy(piece, expression, breaks).add(";\n");
    }

    private void check(Program.CheckCode check, Snippet snippet) {
        String type = check.line().condition() ? "boolean" : "double";
        text.add("public static " + type + " " + checkMethod(check.line().place()) + "() throws Throwable { return ")
                .copy(check.piece(), snippet.expression(), snippet.calls())
                .add(";\n}\n");
    }

    /** The field's Java type; empty while unknown. */
    private String type(Program.Field field) {
        return field.isOpen() ? types.getOrDefault(field.field(), "") : field.type();
    }
}
