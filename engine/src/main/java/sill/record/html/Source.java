package sill.record.html;

import sill.markup.Markup;
import sill.record.DesignRecord.CellEntry;

/** A cell's text as the worksheet has it, folded, with the worksheet's line numbers. */
final class Source {
    private Source() {}

    static void write(Markup page, CellEntry cell) {
        boolean open = cell.kind().equals("tolerance");
        String[] attributes = open ? new String[] {"class", "source", "open", ""} : new String[] {"class", "source"};
        page.open("details", attributes);
        page.leaf("summary", cell.kind().equals("calc") ? "Java source" : "Worksheet text");
        page.open("pre").open("code");
        int number = cell.line();
        for (String line : cell.source().split("\n", -1)) {
            number++;
            page.leaf("span", line, "class", "row", "data-line", Integer.toString(number))
                    .line();
        }
        page.close().close().close().line();
    }
}
