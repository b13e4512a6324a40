package sill.worksheet;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The worksheet's first line, {@code sill 1}. */
final class VersionLine {
    private static final Pattern FORM = Pattern.compile("[\\s\\h]*sill\\b[\\s\\h]*(.*)", Pattern.CASE_INSENSITIVE);
    private static final String WORDS = "sill 1";

    private VersionLine() {}

    /** Whether line 1 speaks of the version, rightly or wrongly; if not, it may be a line of the title block. */
    static boolean check(SourceLine line, ProblemList problems) {
        if (Cursor.strip(line.text()).equals(WORDS) && line.text().startsWith(WORDS)) {
            return true;
        }
        Matcher form = FORM.matcher(line.text());
        boolean version = form.matches();
        Cursor cursor = new Cursor(line.text());
        String hint = version
                        && form.group(1).matches("[0-9.]{1,9}[\\s\\h]*")
                        && !form.group(1).strip().equals("1")
                ? "This Sill reads version 1; a newer one may read this worksheet."
                : "Write 'sill 1' alone on line 1.";
        problems.error(line, TextException.expected("'sill 1'", cursor, hint));
        return version;
    }

    static void reportEmpty(ProblemList problems) {
        problems.error(
                1, 1, "Found an empty worksheet, expected 'sill 1' on line 1", "Start one with 'sill new FILE'.");
    }
}
