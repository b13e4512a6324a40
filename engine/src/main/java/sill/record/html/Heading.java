package sill.record.html;

import java.util.Map;
import sill.markup.Markup;
import sill.record.DesignRecord;
import sill.record.DesignRecord.Verdict;
import sill.values.CellState;

/** The head of the sheet: what it is, and the verdict over all in words. */
final class Heading {
    private Heading() {}

    static void write(Markup page, DesignRecord record) {
        Map<String, String> block = record.titleBlock();
        page.open("header", "class", "head").line();
        page.open("p", "class", "identity");
        identity(page, "Number", block.getOrDefault("number", ""));
        identity(page, "Revision", block.getOrDefault("revision", ""));
        identity(page, "Date", block.getOrDefault("date", ""));
        page.leaf("span", "Design record");
        page.close().line();
        page.leaf("h1", title(record)).line();
        page.open("p", "class", "outcome outcome-" + record.outcome().word());
        page.leaf("strong", outcomeWord(record.outcome())).text(" ").leaf("span", outcomeSentence(record));
        page.close().line();
        if (!record.trial().isEmpty()) {
            page.open("p", "class", "trial");
            page.leaf("strong", "Trial run, not for issue.").text(" In place of the worksheet's values: ");
            String separator = "";
            for (Map.Entry<String, String> trial : record.trial().entrySet()) {
                page.text(separator).leaf("var", trial.getKey()).text(" = " + trial.getValue());
                separator = ", ";
            }
            page.text(".").close().line();
        }
        page.close().line();
    }

    /** The document's title, or the file's name when the worksheet lacks one. */
    static String title(DesignRecord record) {
        String title = record.titleBlock().getOrDefault("title", "").strip();
        String file = record.worksheet().file();
        return !title.isEmpty() ? title : file.isEmpty() ? "Design record" : file;
    }

    private static void identity(Markup page, String name, String text) {
        if (!text.isEmpty()) {
            page.open("span").text(name + " ").leaf("b", text).close().text(" ");
        }
    }

    private static String outcomeWord(DesignRecord.Outcome outcome) {
        return switch (outcome) {
            case HOLDS -> "Holds";
            case FAILS -> "Fails";
            case INCOMPLETE -> "Incomplete";
        };
    }

    static String outcomeSentence(DesignRecord record) {
        int checks = record.checks().size();
        long failing = count(record, Verdict.FAILS);
        long open = count(record, Verdict.NOT_JUDGED);
        long errors =
                record.problems().stream().filter(problem -> problem.isError()).count();
        long unfinished = record.cells().stream()
                .filter(cell -> cell.state() != CellState.DONE)
                .count();
        StringBuilder text = new StringBuilder();
        if (checks == 0) {
            text.append("The worksheet states no checks");
        } else if (checks == 1) {
            text.append("The one check ").append(failing > 0 ? "fails" : open > 0 ? "is not judged" : "holds");
        } else if (failing == 0 && open == 0) {
            text.append("All ").append(checks).append(" checks hold");
        } else {
            long holding = count(record, Verdict.HOLDS);
            text.append(holding).append(" of ").append(checks).append(holding == 1 ? " checks holds" : " checks hold");
            text.append(failing > 0 ? ", " + failing + (failing == 1 ? " fails" : " fail") : "");
            text.append(open > 0 ? ", " + open + (open == 1 ? " is" : " are") + " not judged" : "");
        }
        text.append(errors > 0 ? "; the worksheet has " + counted(errors, "problem") : "");
        text.append(unfinished > 0 ? "; " + counted(unfinished, "cell") + " did not finish" : "");
        return text.append('.').toString();
    }

    private static long count(DesignRecord record, Verdict verdict) {
        return record.checks().stream()
                .filter(check -> check.verdict() == verdict)
                .count();
    }

    static String counted(long number, String noun) {
        return number + " " + noun + (number == 1 ? "" : "s");
    }
}
