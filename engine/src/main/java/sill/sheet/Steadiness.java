package sill.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Tells whether a formula still holds when its cell has ended: the record prints the values that the names have then. It does
 * not when a name is assigned or altered after the formula was computed, or may be at any time by a method or lambda.
 */
final class Steadiness {
    /** Types whose values nobody can alter from inside. */
    private static final Set<String> UNALTERABLE = Set.of(
            "double",
            "float",
            "long",
            "int",
            "short",
            "byte",
            "char",
            "boolean",
            "Double",
            "Integer",
            "Long",
            "Boolean",
            "String",
            "TripPoints",
            "sill.stdlib.TripPoints",
            "java.lang.String");

    private final Map<String, List<Usage>> writes = new HashMap<>();

    /**
     * @param types Java types of the variables declared with {@code var}, by name
     */
    Steadiness(Program program, Map<String, String> types, List<Usage> usages) {
        Map<String, Program.Field> fields = new HashMap<>();
        Map<String, String> typeOf = new HashMap<>(types);
        for (SheetSource.GivenField given : program.givens()) {
            typeOf.put(given.name(), given.type().java());
        }
        for (Program.CellCode cell : program.cells()) {
            for (Program.Field field : cell.fields()) {
                fields.putIfAbsent(field.field(), field);
                if (!field.isOpen()) {
                    typeOf.putIfAbsent(field.field(), field.type());
                }
            }
        }
        for (Usage usage : usages) {
            if (isWrite(usage, fields.get(usage.name()), typeOf.getOrDefault(usage.name(), ""))) {
                writes.computeIfAbsent(usage.name(), name -> new ArrayList<>()).add(usage);
            }
        }
    }

    /** Whether the formula of a field, computed by a snippet, holds for good. */
    boolean holds(String field, Snippet snippet, FormulaReader.Formula formula) {
        if (writes.containsKey(field)) {
            return false;
        }
        for (String name : formula.names()) {
            for (Usage write : writes.getOrDefault(name, List.of())) {
                boolean later = write.piece() == snippet.piece()
                        && write.offset() >= snippet.span().start();
                if (later || write.deferred()) {
                    return false;
                }
            }
        }
        return true;
    }

    private static boolean isWrite(Usage usage, Program.Field field, String type) {
        if (usage.kind() != Usage.Kind.VALUE || usage.how() == Usage.How.READ) {
            return false;
        } else if (usage.how() == Usage.How.ALTERED) {
            return !UNALTERABLE.contains(type);
        }
        return field == null || !isDeclaration(usage, field);
    }

    /** The sheet's class assigns a variable where the worksheet declares it, and a bare expression's field where that stands. */
    private static boolean isDeclaration(Usage usage, Program.Field field) {
        Snippet snippet = field.snippet();
        return usage.piece() == snippet.piece()
                && (field.isBare()
                        || snippet.variables().stream()
                                .anyMatch(variable ->
                                        variable.name().equals(usage.name()) && variable.at() == usage.offset()));
    }
}
