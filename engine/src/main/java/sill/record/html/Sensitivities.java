package sill.record.html;

import java.util.Map;
import sill.markup.Markup;
import sill.record.DesignRecord.GivenEntry;
import sill.record.DesignRecord.ToleranceEntry;
import sill.record.FindingText;
import sill.units.Unit;
import sill.values.Finding;

/** What moves a result, the strongest first: slope, share of the variance, and where each extreme lies. */
final class Sensitivities {
    private Sensitivities() {}

    static void write(Markup page, ToleranceEntry entry, Map<String, GivenEntry> givens) {
        Finding finding = entry.finding();
        if (finding.sensitivities().isEmpty()) {
            return;
        }
        boolean extremes = finding.worstCase().isPresent();
        page.open("table", "class", "stacking sensitivities");
        page.leaf("caption", "What moves " + finding.name(), "class", "unseen").line();
        if (extremes) {
            Tables.head(page, "Given", "Slope", "Share of variance", "Goes", "Lowest at", "Highest at");
        } else {
            Tables.head(page, "Given", "Slope", "Share of variance");
        }
        page.open("tbody").line();
        for (Finding.Sensitivity each : finding.sensitivities()) {
            GivenEntry given = givens.get(each.given());
            Unit unit = entry.givenUnits().get(each.given());
            page.open("tr")
                    .open("th", "scope", "row", "class", "name")
                    .leaf("var", each.given())
                    .close();
            Tables.cell(page, "Slope", "number", new FindingText(finding).slope(each.slope(), unit));
            share(page, each.share());
            if (extremes) {
                int place = finding.varied().indexOf(each.given());
                Finding.WorstCase found = finding.worstCase().get();
                Tables.cell(page, "Goes", "word", found.trends().get(place).word());
                boolean still = found.trends().get(place) == Finding.Trend.STILL;
                double low = found.low().at().get(place);
                double high = found.high().at().get(place);
                Tables.cell(page, "Lowest at", "word", still ? "" : FindingText.place(given, unit, low));
                Tables.cell(page, "Highest at", "word", still ? "" : FindingText.place(given, unit, high));
            }
            page.close().line();
        }
        page.close().close().line();
    }

    private static void share(Markup page, double share) {
        page.open("td", "class", "number", "data-label", "Share of variance");
        page.open("svg", "class", "bar", "viewBox", "0 0 100 10", "preserveAspectRatio", "none", "aria-hidden", "true");
        page.shape("rect", "width", String.valueOf(Math.round(share * 1000) / 10.0), "height", "10")
                .close();
        page.text(" " + FindingText.share(share)).close();
    }
}
