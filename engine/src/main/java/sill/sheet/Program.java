package sill.sheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.worksheet.Problem;

/**
 * A sheet's Java, parsed: what the class is written from. The same for every pass over it.
 *
 * @param givens fields set from outside
 * @param cells calculation and tolerance cells, in order
 * @param checks check lines, in order
 */
record Program(List<SheetSource.GivenField> givens, List<CellCode> cells, List<CheckCode> checks) {
    /**
     * A parsed calculation cell, or a tolerance cell with the expressions that it studies.
     *
     * @param isStudy whether it is a tolerance cell
     * @param snippets those that could be parsed
     * @param faults why the others could not
     * @param lostNames names that the others probably declare, with their offsets
     */
    record CellCode(
            Piece piece,
            boolean isStudy,
            List<Snippet> snippets,
            List<Problem> faults,
            Map<String, Integer> lostNames) {
        int number() {
            return piece.cell();
        }

        /** The values it gives, in order; a bare expression's has a field's name of its own and is shown without one. */
        List<Field> fields() {
            List<Field> fields = new ArrayList<>();
            for (Snippet snippet : snippets) {
                switch (snippet.kind()) {
                    case VARIABLES ->
                        snippet.variables()
                                .forEach(v ->
                                        fields.add(new Field(v.name(), v.name(), v.type(), v.typeSpan(), snippet)));
                    case CALL, EXPRESSION ->
                        fields.add(new Field(
                                "$value" + number() + "_" + (fields.size() + 1),
                                "",
                                Snippet.OPEN,
                                new Span(
                                        snippet.expression().start(),
                                        snippet.expression().start()),
                                snippet));
                    default -> {
                        // Imports, methods, types and statements give no value.
                    }
                }
            }
            return fields;
        }
    }

    /**
     * A field of the sheet's class.
     *
     * @param field its name in the class
     * @param name its name in the worksheet; empty for a bare expression
     * @param type as the compiler prints it; {@link Snippet#OPEN} when open
     * @param typeSpan where the type is written; empty, at the name or the bare expression, when it is open
     */
    record Field(String field, String name, String type, Span typeSpan, Snippet snippet) {
        boolean isOpen() {
            return type.equals(Snippet.OPEN);
        }

        /** Whether the type can be copied from the worksheet; an array's brackets may stand behind the name. */
        boolean typeIsOnePiece() {
            String written = typeSpan.of(snippet.piece().text());
            return written.replaceAll("\\s", "").equals(type.replaceAll("\\s", ""));
        }

        /** Whether it holds a bare expression's value: no other code can name it. */
        boolean isBare() {
            return name.isEmpty();
        }
    }

    /** A parsed check line; empty when its expression can't be parsed. */
    record CheckCode(SheetSource.CheckLine line, Piece piece, Optional<Snippet> snippet, List<Problem> faults) {}

    /** The worksheet's own imports: they hold in the whole sheet, also when another line of their cell is wrong. */
    List<Snippet> imports() {
        return cells.stream()
                .flatMap(cell -> cell.snippets().stream())
                .filter(snippet -> snippet.kind() == Snippet.Kind.IMPORT)
                .toList();
    }

    /** The givens that have a value. */
    List<SheetSource.GivenField> presentGivens() {
        return givens.stream()
                .filter(given -> given.type() != SheetSource.GivenType.MISSING)
                .toList();
    }

    /** The variables declared with {@code var}, by name. */
    Map<String, Field> openVariables() {
        Map<String, Field> open = new LinkedHashMap<>();
        for (CellCode cell : cells) {
            for (Field field : cell.fields()) {
                if (field.isOpen() && !field.isBare()) {
                    open.put(field.field(), field);
                }
            }
        }
        return open;
    }
}
