package sill.worksheet;

import java.util.List;
import sill.words.NearestWord;
import sill.words.Quoted;
import sill.worksheet.ToleranceStudy.Method;
import sill.worksheet.ToleranceStudy.Target;

/** Reads one method of a tolerance cell. */
final class MethodReader {
    /** Fewer samples say nothing about the quantiles a record prints; more would not fit in memory beside the rest. */
    private static final int FEWEST = 100;

    private static final int MOST = 1_000_000_000;
    private static final List<String> WORDS = List.of("worst-case", "rss", "monte-carlo");

    private MethodReader() {}

    static Method read(Target target) throws TextException {
        int start = target.column() - 1;
        String[] words = target.text().split("[\\s\\h]+", 6);
        switch (words[0]) {
            case "worst-case" -> {
                refuseMore(words, 1, start);
                return new Method.WorstCase();
            }
            case "rss" -> {
                refuseMore(words, 1, start);
                return new Method.RootSumSquare();
            }
            case "monte-carlo" -> {
                return monteCarlo(words, start);
            }
            default ->
                throw new TextException(
                        start,
                        "Found the method " + Quoted.of(words[0]) + ", expected worst-case, rss or monte-carlo",
                        NearestWord.hint(words[0], WORDS, ""));
        }
    }

    private static Method monteCarlo(String[] words, int start) throws TextException {
        String form = "Write 'monte-carlo 200000 seed 7'.";
        if (words.length < 2) {
            throw new TextException(start, "Found 'monte-carlo' alone, expected a number of samples and a seed", form);
        }
        long samples = whole(words[1]);
        if (samples < FEWEST || samples > MOST) {
            throw new TextException(
                    start,
                    "Found " + Quoted.of(words[1]) + " samples, expected a whole number from " + FEWEST + " to " + MOST,
                    form);
        }
        if (words.length < 4 || !words[2].equals("seed")) {
            throw new TextException(
                    start, "Found 'monte-carlo' without its seed, expected 'seed' and a whole number", form);
        }
        long seed = whole(words[3]);
        if (seed < 0) {
            throw new TextException(
                    start,
                    "Found the seed " + Quoted.of(words[3]) + ", expected a whole number from 0 to " + Long.MAX_VALUE,
                    form);
        }
        refuseMore(words, 4, start);
        return new Method.MonteCarlo((int) samples, seed);
    }

    private static void refuseMore(String[] words, int most, int start) throws TextException {
        if (words.length > most) {
            throw new TextException(
                    start,
                    "Found " + Quoted.of(words[most]) + " after " + Quoted.of(words[0])
                            + ", expected ',' or the end of the line",
                    "");
        }
    }

    /** A whole number of at most 19 digits; −1 for anything else. */
    private static long whole(String digits) {
        if (!digits.matches("[0-9]{1,19}")) {
            return -1;
        }
        try {
            return Long.parseLong(digits);
        } catch (NumberFormatException e) {
            return -1;
        }
    }
}
