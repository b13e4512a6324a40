package sill.record.html;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.markup.Markup;
import sill.record.DesignRecord.ToleranceEntry;
import sill.record.FindingText;
import sill.values.Finding;

/** A tolerance cell: a table of what it found, then what each of these figures rests on. */
final class Tolerances {
    private Tolerances() {}

    static void write(Markup page, int cell, CellContent content) {
        List<ToleranceEntry> entries = content.tolerances(cell);
        if (entries.isEmpty()) {
            return;
        }
        table(page, cell, entries);
        for (ToleranceEntry entry : entries) {
            page.open("div", "class", "finding");
            page.open("h4")
                    .leaf("var", entry.finding().name())
                    .text(" over tolerance")
                    .close();
            entry.finding().remarks().forEach(remark -> page.leaf("p", remark, "class", "state"));
            ToleranceFigures.write(page, entry);
            figures(page, entry.finding());
            Sensitivities.write(page, entry, content.givensByName());
            page.close().line();
        }
    }

    private static void table(Markup page, int cell, List<ToleranceEntry> entries) {
        page.open("table", "class", "stacking");
        page.leaf("caption", "Results of cell " + cell + " over tolerance", "class", "unseen")
                .line();
        Tables.head(page, "At", "Result", "Nominal", "Worst case", "Root sum square", "Monte Carlo");
        page.open("tbody").line();
        for (ToleranceEntry entry : entries) {
            Finding finding = entry.finding();
            FindingText text = new FindingText(finding);
            page.open("tr").open("th", "scope", "row", "class", "at");
            Addresses.write(page, entry.at(), finding.component().isEmpty() || isFirst(entries, entry));
            page.close();
            page.open("td", "data-label", "Result").leaf("var", finding.name()).close();
            Tables.cell(page, "Nominal", "number", text.number(finding.nominal()));
            range(
                    page,
                    "Worst case",
                    finding.worstCase()
                            .map(found ->
                                    text.range(found.low().value(), found.high().value())));
            range(page, "Root sum square", finding.rootSumSquare().map(found -> text.range(found.low(), found.high())));
            quantiles(page, text, finding.monteCarlo());
            page.close().line();
        }
        page.close().close().line();
    }

    private static boolean isFirst(List<ToleranceEntry> entries, ToleranceEntry entry) {
        return entries.stream()
                        .filter(each -> each.at().equals(entry.at()))
                        .findFirst()
                        .orElseThrow()
                == entry;
    }

    private static void range(Markup page, String column, Optional<String> shown) {
        Tables.cell(page, column, "number", shown.orElse(""));
    }

    /** The quantiles that lie one and, on either side, three standard deviations from the middle of a normal spread. */
    private static void quantiles(Markup page, FindingText text, Optional<Finding.MonteCarlo> found) {
        page.open("td", "class", found.isPresent() ? "number" : "number empty", "data-label", "Monte Carlo");
        if (found.isPresent()) {
            page.open("span", "class", "quantiles");
            for (String probability : List.of("0.00135", "0.5", "0.99865")) {
                page.open("span").leaf("span", FindingText.percent(probability), "class", "share");
                page.text(" " + text.number(found.get().quantiles().get(probability)))
                        .close()
                        .text(" ");
            }
            page.close();
        }
        page.close();
    }

    private static void figures(Markup page, Finding finding) {
        Map<String, String> figures = new FindingText(finding).figures(finding);
        if (figures.isEmpty()) {
            return;
        }
        page.open("dl", "class", "fields");
        figures.forEach((name, figure) -> page.leaf("dt", name).leaf("dd", figure));
        page.close().line();
    }
}
