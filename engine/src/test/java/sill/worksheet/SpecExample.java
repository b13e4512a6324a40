package sill.worksheet;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A numbered example of {@code spec/worksheet-text.txt}.
 *
 * @param number as the spec counts
 * @param kind what the text is a part of
 * @param title what it shows
 * @param text as in the spec, with signs for characters that do not print
 * @param expected what reading it gives
 */
record SpecExample(int number, String kind, String title, String text, String expected) {
    private static final Pattern HEAD = Pattern.compile("\\[(\\d+) (sheet|title|given|check|tolerance)\\] (.+)");

    private static final String SIGNS = "␉␀␌␍␠␣␦";
    private static final String MEANT = "\t\0\f\r \u00a0\ud800";

    static List<SpecExample> all() {
        List<SpecExample> examples = new ArrayList<>();
        List<String> lines = lines();
        for (int at = 0; at < lines.size(); at++) {
            Matcher head = HEAD.matcher(lines.get(at));
            if (head.matches()) {
                int gives = at + lines.subList(at, lines.size()).indexOf("[gives]");
                int end = at + lines.subList(at, lines.size()).indexOf("[end]");
                if (gives < at || end < gives) {
                    throw new IllegalStateException("Spec line " + (at + 1) + ": no [gives] or no [end] behind it");
                }
                examples.add(new SpecExample(
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
        return switch (kind) {
            case "title" -> "sill 1\n" + real();
            case "given" -> "sill 1\ntitle: T\n:: given G\n" + real();
            case "check" ->
                "sill 1\ntitle: T\n:: check C\n" + real()
                        + "\n:: tolerance S\nof: band, ok\nmethod: worst-case, monte-carlo 1000 seed 1";
            case "tolerance" ->
                "sill 1\ntitle: T\n:: tolerance S\n" + real()
                        + "\n:: given G\nvIn = 5 V ± 1 %\nrTop = 10 kΩ ± 1 %\nvFix = 1 V\npart = \"x\"";
            default -> real();
        };
    }

    private String real() {
        String real = text;
        for (int sign = 0; sign < SIGNS.length(); sign++) {
            real = real.replace(SIGNS.charAt(sign), MEANT.charAt(sign));
        }
        return real;
    }

    /** A text as the spec prints it. */
    static String withSigns(String real) {
        String text = real;
        for (int sign = 0; sign < SIGNS.length(); sign++) {
            if (MEANT.charAt(sign) != ' ') {
                text = text.replace(MEANT.charAt(sign), SIGNS.charAt(sign));
            }
        }
        return text;
    }

    private static List<String> lines() {
        try (InputStream spec = SpecExample.class.getResourceAsStream("/spec/worksheet-text.txt")) {
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
