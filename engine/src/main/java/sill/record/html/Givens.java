package sill.record.html;

import java.util.List;
import sill.markup.Markup;
import sill.record.DesignRecord.CellEntry;
import sill.record.DesignRecord.GivenEntry;
import sill.values.Datum;

/** A given cell: its input values as a table. */
final class Givens {
    private Givens() {}

    static void write(Markup page, CellEntry cell, List<GivenEntry> givens) {
        if (givens.isEmpty()) {
            return;
        }
        page.open("table", "class", "stacking givens");
        page.leaf("caption", "Givens of cell " + cell.number(), "class", "unseen")
                .line();
        Tables.head(page, "At", "Name", "Value", "Limits", "Distribution", "Remark");
        page.open("tbody").line();
        for (GivenEntry given : givens) {
            page.open("tr");
            page.open("td", "class", "at");
            Addresses.write(page, given.at(), true);
            page.close();
            page.open("th", "scope", "row", "class", "name")
                    .leaf("var", given.name())
                    .close();
            String brief = given.shown().isEmpty() ? Values.brief(given.value(), given.unit()) : given.shown();
            page.open("td", "class", "number" + Tables.length(brief), "data-label", "Value");
            value(page, given, brief);
            page.close();
            Tables.cell(page, "Limits", "number", given.shownLimits());
            Tables.cell(page, "Distribution", "word", given.distribution());
            Tables.cell(page, "Remark", "remark", given.remark());
            page.close().line();
        }
        page.close().close().line();
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
