package sill.record.html;

import java.util.List;
import sill.markup.Markup;
import sill.record.DesignRecord;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.Verdict;
import sill.trace.TraceKind;

/** Requirements and how the design meets them. */
final class Checks {
    private Checks() {}

    /** All checks of the record, at its head. */
    static void write(Markup page, DesignRecord record, RecordTrace trace) {
        page.open("section", "class", "checks", "aria-labelledby", "checks").line();
        page.leaf("h2", "Checks", "id", "checks").line();
        if (record.checks().isEmpty()) {
            page.leaf("p", "The worksheet states no checks.").line();
        } else {
            table(page, record.checks(), trace, "All checks, with value, limit and margin", Place.AT_HEAD);
        }
        page.close().line();
    }

    /** Whether a table of checks is the summary, whose addresses lead to the cells, or stands in its cell. */
    enum Place {
        AT_HEAD,
        IN_CELL
    }

    /** A table of checks; on a narrow screen each becomes a card. */
    static void table(Markup page, List<CheckEntry> checks, RecordTrace trace, String caption, Place place) {
        page.open("table", "class", "stacking");
        page.leaf("caption", caption, "class", "unseen").line();
        Tables.head(page, "At", "Requirement", "Value", "Limit", "Margin", "Verdict", "Remark");
        page.open("tbody").line();
        for (CheckEntry check : checks) {
            row(page, check, trace, place);
        }
        page.close().close().line();
    }

    private static void row(Markup page, CheckEntry check, RecordTrace trace, Place place) {
        page.open("tr", "class", "verdict-" + verdictClass(check.verdict()));
        page.open("th", "scope", "row", "class", "at");
        Addresses.write(page, check.at(), place == Place.IN_CELL);
        page.close();
        page.open("td", "data-label", "Requirement");
        page.open("details", "class", "traced").open("summary");
        page.leaf("code", check.text()).close();
        TracePanel.write(page, trace, trace.place(TraceKind.CHECK, check.at()));
        page.close().text(" ");
        page.leaf("span", basis(check, trace), "class", "basis").close();
        judged(page, check, "Value", check.shownValue());
        judged(page, check, "Limit", check.shownLimit());
        margin(page, check);
        page.open("td", "data-label", "Verdict");
        page.open("span", "class", "verdict");
        page.leaf("span", sign(check.verdict()), "class", "sign", "aria-hidden", "true");
        page.text(" " + check.verdict().word()).close();
        if (!check.reason().isEmpty()) {
            page.text(" ").leaf("span", check.reason(), "class", "reason");
        }
        page.close();
        Tables.cell(page, "Remark", "remark", check.remark());
        page.close().line();
    }

    private static String basis(CheckEntry check, RecordTrace trace) {
        return switch (check.basis()) {
            case "nominal" ->
                trace.restsOnTolerances(check)
                        ? "at the nominal values only, though inputs have tolerances"
                        : "at the nominal values";
            case "worst-case" -> "at worst case";
            case "share" -> "in a share of samples";
            default -> check.basis();
        };
    }

    /** What is said of a share of samples is long, and may break. */
    private static void judged(Markup page, CheckEntry check, String column, String shown) {
        if (check.basis().equals("share") && !shown.isEmpty()) {
            page.leaf("td", shown, "class", "number", "data-label", column);
        } else {
            Tables.cell(page, column, "number", shown);
        }
    }

    private static void margin(Markup page, CheckEntry check) {
        page.open("td", "class", "number" + Tables.length(check.shownMargin()), "data-label", "Margin");
        page.leaf("span", check.shownMargin());
        // The margin of a share of samples is one of shares, that share is of the nominal value.
        boolean ofSamples = check.overTolerance().share().isPresent();
        if (check.marginShare().isPresent()
                && !ofSamples
                && !check.shownMargin().isEmpty()) {
            page.text(" ").leaf("span", Numbers.percent(check.marginShare().get()), "class", "share");
        }
        page.close();
    }

    private static String sign(Verdict verdict) {
        return switch (verdict) {
            case HOLDS -> "✓";
            case FAILS -> "✗";
            case NOT_JUDGED -> "?";
        };
    }

    private static String verdictClass(Verdict verdict) {
        return verdict.word().replace(' ', '-');
    }
}
