package sill.record.html;

import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import sill.markup.Markup;
import sill.plot.PlotDrawing;
import sill.record.DesignRecord.PlotEntry;
import sill.record.DesignRecord.ValueEntry;
import sill.record.RecordJson;
import sill.trace.TraceKind;
import sill.values.Datum;

/** A calculation cell: its results as lines <i>name = formula = value</i>, and its plots. */
final class Calculations {
    /** A table up to this many rows is shown without asking. */
    private static final int SHORT_TABLE = 12;

    private Calculations() {}

    static void write(Markup page, int cell, CellContent content) {
        SortedMap<Integer, Runnable> inOrder = new TreeMap<>();
        content.values(cell)
                .forEach(value -> inOrder.put(Addresses.index(value.at()), () -> line(page, value, content.trace())));
        // A plot that also has a value of its own stands in its place.
        content.plots(cell)
                .forEach(plot -> inOrder.put(Addresses.index(plot.at()), () -> figure(page, plot, content.trace())));
        inOrder.values().forEach(Runnable::run);
    }

    private static void line(Markup page, ValueEntry value, RecordTrace trace) {
        page.open("div", "class", "line");
        Addresses.write(page, value.at(), true);
        page.open("div", "class", "equation");
        boolean inOwnWords = value.shown().isEmpty() || Values.isTable(value.value());
        String shown = inOwnWords ? Values.brief(value.value(), value.unit()) : value.shown();
        if (value.working().isPresent()) {
            Workings.line(page, value.working().get().lines().get(0), name -> trace.placeFrom(value.at(), name));
        } else {
            source(page, value, shown);
        }
        result(page, value, shown, trace);
        value.working().ifPresent(working -> Workings.beneath(page, working));
        page.close();
        if (!value.caption().isEmpty()) {
            page.leaf("div", value.caption(), "class", "meaning");
        }
        page.close().line();
    }

    /** Name and Java of what has no mathematics. */
    private static void source(Markup page, ValueEntry value, String shown) {
        if (!value.name().isEmpty()) {
            page.leaf("var", value.name()).text(" = ");
        }
        if (!value.formula().isEmpty() && !value.formula().equals(shown)) {
            page.leaf("code", value.formula()).text(" = ");
        }
    }

    /** The value in brief, and on demand in full with its type and what it rests on; needs no script. */
    private static void result(Markup page, ValueEntry value, String shown, RecordTrace trace) {
        boolean table = Values.isTable(value.value());
        boolean components = !table && !value.shownComponents().isEmpty();
        boolean shortTable = table && Values.rows(value.value()) <= SHORT_TABLE;
        page.open(
                "details",
                shortTable ? new String[] {"class", "result", "open", ""} : new String[] {"class", "result"});
        page.open("summary");
        if (components) {
            page.open("span", "class", "components");
            for (Map.Entry<String, String> component : value.shownComponents().entrySet()) {
                page.open("span").leaf("var", component.getKey()).text(" " + component.getValue());
                page.close().text(" ");
            }
            page.close();
        } else {
            page.leaf("span", shown, "class", value.value() instanceof Datum.Text ? "string" : "number");
        }
        page.close();
        page.open("div", "class", "full");
        Values.full(page, value.value(), value.unit(), value.componentUnits(), value.shownFull());
        page.open("p", "class", "rests").text("Type ").leaf("code", value.type());
        page.text(", worksheet line " + value.line() + ".").close();
        TracePanel.write(page, trace, trace.place(TraceKind.RESULT, value.at()));
        page.close().close();
    }

    private static void figure(Markup page, PlotEntry plot, RecordTrace trace) {
        page.open("figure", "class", "line");
        Addresses.write(page, plot.at(), true);
        Tables.openScrolling(page, "Plot " + plot.at());
        page.trusted(PlotDrawing.svg(plot.plot(), RecordJson.plotId(plot.at())));
        page.close();
        String title = plot.plot().title();
        String caption = plot.caption().isEmpty() ? title : plot.caption();
        page.open("figcaption").text(caption);
        if (!title.isEmpty() && !title.equals(caption)) {
            page.text(" – " + title);
        }
        page.open("details", "class", "traced").leaf("summary", "What it shows rests on");
        TracePanel.write(page, trace, trace.place(TraceKind.PLOT, plot.at()));
        page.close();
        page.close().close().line();
    }
}
