package sill.record.html;

import java.util.List;
import sill.markup.Markup;
import sill.markup.VisibleText;
import sill.record.DesignRecord;
import sill.worksheet.Problem;

/** What is wrong with the worksheet: each problem with its line and a caret under the place. */
final class Problems {
    /** A longer line is shown in part. */
    private static final int BEFORE = 60;

    private static final int AFTER = 40;

    private Problems() {}

    static void write(Markup page, DesignRecord record) {
        if (record.problems().isEmpty()) {
            return;
        }
        List<String> lines = record.worksheet().text().lines().toList();
        page.open("section", "class", "problems", "aria-labelledby", "problems").line();
        page.leaf("h2", "Problems", "id", "problems").line();
        page.open("ol", "class", "problem-list").line();
        for (Problem problem : record.problems()) {
            page.open("li", "class", problem.isError() ? "error" : "warning");
            page.open("p").leaf("strong", problem.isError() ? "Error" : "Warning", "class", "severity");
            page.text(" in line " + problem.line() + ", column " + problem.column());
            if (problem.cell() > 0) {
                page.text(", ").leaf("a", "cell " + problem.cell(), "href", "#cell-" + problem.cell());
            }
            page.text(": ")
                    .leaf("span", problem.message(), "class", "message")
                    .text(".")
                    .close();
            if (problem.line() >= 1 && problem.line() <= lines.size()) {
                quote(page, lines.get(problem.line() - 1), problem.column());
            }
            if (!problem.hint().isEmpty()) {
                page.leaf("p", problem.hint(), "class", "hint");
            }
            page.close().line();
        }
        page.close().close().line();
    }

    private static void quote(Markup page, String line, int column) {
        int at = Math.max(0, Math.min(column - 1, line.length()));
        int from = Math.max(0, at - BEFORE);
        int to = Math.min(line.length(), at + AFTER);
        String before = (from > 0 ? "…" : "") + VisibleText.of(line.substring(from, at));
        String after = VisibleText.of(line.substring(at, to)) + (to < line.length() ? "…" : "");
        // A tab stays a tab, so that the caret stands under its place whatever the tab's width.
        String indent = before.replaceAll("[^\\t]", " ");
        page.open("pre", "class", "quote").leaf("code", before + after).text("\n");
        page.leaf("span", indent + "^", "class", "caret", "aria-hidden", "true").close();
    }
}
