package sill.cli;

import java.nio.file.Path;
import java.util.List;
import sill.cli.Terminal.Colour;
import sill.record.DesignRecord;
import sill.record.DesignRecord.CheckEntry;
import sill.record.DesignRecord.Outcome;
import sill.record.DesignRecord.Verdict;
import sill.units.Notation;
import sill.values.CellState;
import sill.worksheet.Problem;

/** What {@code run} prints of a record: what ran, each check, each problem with its line, where the record is. */
final class RunReport {
    /** A margin of many times the limit's size is told by its number alone. */
    private static final double LARGEST_SHARE = 10;

    private final Terminal terminal;
    private final DesignRecord record;

    RunReport(Terminal terminal, DesignRecord record) {
        this.terminal = terminal;
        this.record = record;
    }

    void print(Path page) {
        heading();
        checks();
        String[] lines = record.worksheet().text().split("\r\n|\r|\n", -1);
        record.problems().forEach(problem -> problem(problem, lines));
        verdict();
        terminal.line("record: " + page);
    }

    private void heading() {
        List<CellState> states = record.cells().stream()
                .filter(cell -> cell.kind().equals("calc"))
                .map(DesignRecord.CellEntry::state)
                .toList();
        long done = states.stream().filter(CellState.DONE::equals).count();
        String title = record.titleBlock().getOrDefault("title", "");
        terminal.line(record.worksheet().file() + (title.isEmpty() ? "" : " \"" + title + "\"") + ": " + done + " of "
                + states.size() + " calculation cells ran, " + record.values().size()
                + (record.values().size() == 1 ? " value" : " values"));
    }

    private void checks() {
        int address = width(record.checks().stream().map(CheckEntry::at).toList());
        int text = width(record.checks().stream().map(CheckEntry::text).toList());
        int word = Verdict.NOT_JUDGED.word().length();
        for (CheckEntry check : record.checks()) {
            String said = check.verdict() == Verdict.NOT_JUDGED ? check.reason() : values(check);
            terminal.line(
                    "  " + padded(check.at(), address) + "  ",
                    colour(check.verdict()),
                    padded(check.verdict().word(), word),
                    "  " + padded(Terminal.safe(check.text()), text) + "  " + said);
        }
    }

    private static String values(CheckEntry check) {
        if (check.margin().isEmpty()) {
            return check.shownValue();
        }
        String share = check.marginShare()
                .filter(part -> check.overTolerance().share().isEmpty())
                .filter(part -> Math.abs(part) < LARGEST_SHARE)
                .map(part -> " (" + String.valueOf(Math.round(part * 100)).replace('-', Notation.MINUS) + " %)")
                .orElse("");
        return check.shownValue() + ", limit " + check.shownLimit() + ", margin " + check.shownMargin() + share;
    }

    private void problem(Problem problem, String[] lines) {
        terminal.line(
                problem.isError() ? Colour.RED : Colour.YELLOW,
                problem.isError() ? "problem" : "warning",
                " at line " + problem.line() + ", column " + problem.column() + ": " + problem.message());
        if (problem.line() <= lines.length && !lines[problem.line() - 1].isBlank()) {
            Excerpt.around(lines[problem.line() - 1], problem.line(), problem.column())
                    .forEach(terminal::line);
        }
        if (!problem.hint().isEmpty()) {
            terminal.line("  mend: " + problem.hint());
        }
    }

    private void verdict() {
        long holds = record.checks().stream()
                .filter(check -> check.verdict() == Verdict.HOLDS)
                .count();
        int all = record.checks().size();
        terminal.line(
                colour(record.outcome()),
                record.outcome().word(),
                ": " + problems() + (all == 0 ? "there are no checks" : holds + " of " + all + " checks hold"));
    }

    /** As in {@code 2 problems, }; a line with a problem may be a check that is not even counted. */
    private String problems() {
        long count = record.problems().stream().filter(Problem::isError).count();
        return count == 0 ? "" : count + (count == 1 ? " problem, " : " problems, ");
    }

    private static Colour colour(Verdict verdict) {
        return switch (verdict) {
            case HOLDS -> Colour.GREEN;
            case FAILS -> Colour.RED;
            case NOT_JUDGED -> Colour.YELLOW;
        };
    }

    private static Colour colour(Outcome outcome) {
        return switch (outcome) {
            case HOLDS -> Colour.GREEN;
            case FAILS -> Colour.RED;
            case INCOMPLETE -> Colour.YELLOW;
        };
    }

    private static int width(List<String> texts) {
        return texts.stream()
                .mapToInt(text -> Terminal.safe(text).length())
                .max()
                .orElse(0);
    }

    private static String padded(String text, int width) {
        return text + " ".repeat(Math.max(0, width - text.length()));
    }
}
