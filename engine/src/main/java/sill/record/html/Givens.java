package sill.record.html;

import java.util.ArrayList;
import java.util.List;
import sill.formula.Expression;
import sill.formula.MathWriter;
import sill.markup.Markup;
import sill.record.DesignRecord.CellEntry;
import sill.record.DesignRecord.GivenEntry;
import sill.trace.TraceKind;
import sill.values.Datum;

/** A given cell: its input values as a table. */
final class Givens {
    private Givens() {}

    static void write(Markup page, CellEntry cell, CellContent content) {
        List<GivenEntry> givens = content.givens(cell.number());
        if (givens.isEmpty()) {
            return;
        }
        page.open("table", "class", "stacking givens");
        page.leaf("caption", "Givens of cell " + cell.number(), "class", "unseen")
                .line();
        // A column that no given of the cell has anything in says nothing.
        boolean limits = givens.stream().anyMatch(given -> !given.shownLimits().isEmpty());
        boolean distributions =
                givens.stream().anyMatch(given -> !given.distribution().isEmpty());
        List<String> columns = new ArrayList<>(List.of("At", "Name", "Value", "Limits", "Distribution", "Remark"));
        columns.removeIf(
                column -> column.equals("Limits") && !limits || column.equals("Distribution") && !distributions);
        Tables.head(page, columns.toArray(String[]::new));
        page.open("tbody").line();
        for (GivenEntry given : givens) {
            page.open("tr");
            page.open("td", "class", "at");
            Addresses.write(page, given.at(), true);
            page.close();
            int place = content.trace().place(TraceKind.GIVEN, given.at());
            name(page, given, content.trace(), place);
            String brief = given.shown().isEmpty() ? Values.brief(given.value(), given.unit()) : given.shown();
            page.open("td", "class", "number" + Tables.length(brief), "data-label", "Value");
            value(page, given, brief);
            page.close();
            if (limits) {
                Tables.cell(page, "Limits", "number", given.shownLimits());
            }
            if (distributions) {
                Tables.cell(page, "Distribution", "word", given.distribution());
            }
            remark(page, given, content.trace().isUnused(place));
            page.close().line();
        }
        page.close().close().line();
    }

    /** The name, as formulas write it and as the worksheet does where that differs, and on demand what uses it. */
    private static void name(Markup page, GivenEntry given, RecordTrace trace, int place) {
        page.open("th", "scope", "row", "class", "name");
        page.open("details", "class", "traced").open("summary");
        if (MathWriter.isAsTyped(given.name())) {
            page.leaf("var", given.name());
        } else {
            MathWriter.first(page, new Expression.Name(given.name()));
            page.text(" ").leaf("code", given.name());
        }
        page.close();
        TracePanel.write(page, trace, place);
        page.close().close();
    }

    private static void remark(Markup page, GivenEntry given, boolean unused) {
        if (!unused) {
            Tables.cell(page, "Remark", "remark", given.remark());
            return;
        }
        page.open("td", "class", "remark", "data-label", "Remark").open("span");
        page.text(given.remark().isEmpty() ? "" : given.remark() + " ");
        page.leaf("span", TracePanel.UNUSED, "class", "unused").close().close();
    }

    private static void value(Markup page, GivenEntry given, String brief) {
        if (given.value() instanceof Datum.Items items && items.items().size() > Values.SHORT_LIST) {
            page.open("details").leaf("summary", brief);
            Values.full(page, given.value(), given.unit());
            page.close();
        } else {
            page.text(brief);
        }
    }
}
