package sill.worker;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A row of {@code units/unit-slips.txt}.
 *
 * @param fine whether its units go together
 * @param name what it shows
 * @param code lines behind the givens
 * @param expected what is inferred or told
 */
record UnitRow(boolean fine, String name, String code, String expected) {
    private static final Pattern HEAD = Pattern.compile("\\[(fine|slip)\\] (.+)");

    static List<UnitRow> all() {
        List<String> lines = lines();
        String givens = String.join("\n", between(lines, 0, "[givens]", "[end]"));
        List<UnitRow> rows = new ArrayList<>();
        for (int at = 0; at < lines.size(); at++) {
            Matcher head = HEAD.matcher(lines.get(at));
            if (head.matches()) {
                List<String> code = between(lines, at, lines.get(at), "[gives]");
                List<String> expected = between(lines, at, "[gives]", "[end]");
                String text = "sill 1\ntitle: T\n:: given G\n" + givens + "\n:: calc C\n" + String.join("\n", code);
                rows.add(new UnitRow(head.group(1).equals("fine"), head.group(2), text, String.join("\n", expected)));
            }
        }
        return rows;
    }

    @Override
    public String toString() {
        return (fine ? "fine: " : "slip: ") + name;
    }

    private static List<String> between(List<String> lines, int from, String start, String end) {
        List<String> rest = lines.subList(from, lines.size());
        int first = rest.indexOf(start) + 1;
        int last = rest.indexOf(end);
        if (first == 0 || last < first) {
            throw new IllegalStateException("line " + (from + 1) + ": no " + start + " or no " + end + " behind it");
        }
        return rest.subList(first, last);
    }

    private static List<String> lines() {
        try (InputStream table = UnitRow.class.getResourceAsStream("/units/unit-slips.txt")) {
            return new String(table.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .toList();
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
