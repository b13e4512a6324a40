package sill.record.html;

import java.util.List;
import sill.markup.Markup;
import sill.record.DesignRecord;
import sill.record.DesignRecord.CellEntry;
import sill.values.CellState;

/** The cells of the worksheet in order, each with what it came to. */
final class Cells {
    private Cells() {}

    static void write(Markup page, DesignRecord record, RecordTrace trace) {
        page.open("section", "class", "working", "aria-labelledby", "working").line();
        page.leaf("h2", "Working", "id", "working").line();
        CellContent content = CellContent.of(record, trace);
        for (CellEntry cell : record.cells()) {
            write(page, cell, content);
        }
        page.close().line();
    }

    private static void write(Markup page, CellEntry cell, CellContent content) {
        String id = "cell-" + cell.number();
        page.open("section", "class", "cell cell-" + kindWord(cell), "id", id, "aria-labelledby", id + "-caption")
                .line();
        page.open("h3", "id", id + "-caption");
        page.leaf("span", Integer.toString(cell.number()), "class", "number").text(" ");
        page.text(cell.caption().isEmpty() ? kindName(cell) : cell.caption()).text(" ");
        page.leaf("span", kindName(cell), "class", "kind").close().line();
        state(page, cell);
        switch (kindWord(cell)) {
            case "note" -> Notes.write(page, cell.source());
            case "given" -> Givens.write(page, cell, content);
            case "calc" -> Calculations.write(page, cell.number(), content);
            case "tolerance" -> Tolerances.write(page, cell.number(), content);
            case "check" -> {
                if (!content.checks(cell.number()).isEmpty()) {
                    String caption = "Checks of cell " + cell.number();
                    Checks.table(page, content.checks(cell.number()), content.trace(), caption, Checks.Place.IN_CELL);
                }
            }
            default -> {}
        }
        if (!cell.output().isEmpty()) {
            page.open("div", "class", "output").leaf("p", "Printed:", "class", "lead");
            page.leaf("pre", cell.output()).close().line();
        }
        if (!kindWord(cell).equals("note") && !cell.source().isEmpty()) {
            Source.write(page, cell);
        }
        page.close().line();
    }

    /** Why there is nothing to show, or less than expected; a cell that ended as it should says nothing. */
    private static void state(Markup page, CellEntry cell) {
        if (cell.state() == CellState.DONE && cell.reason().isEmpty()) {
            return;
        }
        page.open("p", "class", "state state-" + cell.state().word().replace(' ', '-'));
        if (cell.state() == CellState.DONE) {
            page.text(cell.reason());
        } else {
            page.leaf("strong", stateWords(cell.state()));
            page.text(cell.reason().isEmpty() ? "" : ": " + cell.reason());
        }
        page.close().line();
    }

    private static String stateWords(CellState state) {
        return switch (state) {
            case DONE -> "Done";
            case PROBLEM -> "Problem";
            case NOT_RUN -> "Not run";
            case STOPPED -> "Stopped";
        };
    }

    /** The kind, if it is one that this page knows; it becomes a class name. */
    private static String kindWord(CellEntry cell) {
        return List.of("note", "given", "calc", "tolerance", "check").contains(cell.kind()) ? cell.kind() : "other";
    }

    private static String kindName(CellEntry cell) {
        return switch (cell.kind()) {
            case "note" -> "Note";
            case "given" -> "Givens";
            case "calc" -> "Calculation";
            case "tolerance" -> "Tolerance";
            case "check" -> "Checks";
            default -> cell.kind();
        };
    }
}
