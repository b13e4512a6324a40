package sill.worker;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A numbered example of {@code spec/java-cells.txt}.
 *
 * @param number as the spec counts
 * @param kind what the text is a part of
 * @param title what it shows
 * @param text as in the spec
 * @param expected what running it gives
 */
record CellExample(int number, String kind, String title, String text, String expected) {
    private static final Pattern HEAD = Pattern.compile("\\[(\\d+) (calc|trace|sheet)\\] (.+)");

    static List<CellExample> all() {
        List<CellExample> examples = new ArrayList<>();
        List<String> lines = lines();
        for (int at = 0; at < lines.size(); at++) {
            Matcher head = HEAD.matcher(lines.get(at));
            if (head.matches()) {
                int gives = at + lines.subList(at, lines.size()).indexOf("[gives]");
                int end = at + lines.subList(at, lines.size()).indexOf("[end]");
                if (gives < at || end < gives) {
                    throw new IllegalStateException("Spec line " + (at + 1) + ": no [gives] or no [end] behind it");
                }
                examples.add(new CellExample(
                        Integer.parseInt(head.group(1)),
                        head.group(2),
                        head.group(3),
                        String.join("\n", lines.subList(at + 1, gives)),
                        String.join("\n", lines.subList(gives + 1, end))));
                at = end;
            }
        }
        return examples;
    }

    /** The whole worksheet, with LF. */
    String worksheet() {
        return kind.equals("sheet")
                ? text
                : "sill 1\ntitle: T\n:: given G\nvIn = 5 V\nrTop = 10 kΩ\ntemps = [-10, 25] °C\npart = \"film\"\n:: calc C\n"
                        + text;
    }

    boolean showsTrace() {
        return kind.equals("trace");
    }

    private static List<String> lines() {
        try (InputStream spec = CellExample.class.getResourceAsStream("/spec/java-cells.txt")) {
            return new String(spec.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .toList();
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    @Override
    public String toString() {
        return number + " " + title;
    }
}
