package sill.tests.benchmark;

import java.util.List;
import java.util.Locale;

/**
 * A line of the benchmark's table.
 *
 * @param name what was measured
 * @param value the figure
 * @param unit its unit; empty for a ratio
 * @param aim what it shall not exceed or not fall below; NaN when nothing is asked of it
 * @param atLeast whether it shall not fall below the aim
 */
record Figure(String name, double value, String unit, double aim, boolean atLeast) {
    /** A figure that shall not exceed its aim. */
    Figure(String name, double value, String unit, double aim) {
        this(name, value, unit, aim, false);
    }

    /** A figure of which nothing is asked. */
    Figure(String name, double value, String unit) {
        this(name, value, unit, Double.NaN);
    }

    private boolean reached() {
        return atLeast ? value >= aim : value <= aim;
    }

    private String line(int width) {
        String verdict = Double.isNaN(aim)
                ? ""
                : String.format(
                        Locale.ROOT,
                        "   aim: at %s %s %s",
                        atLeast ? "least" : "most",
                        trimmed(aim),
                        reached() ? "(reached)" : "(MISSED)");
        return String.format(Locale.ROOT, "%-" + width + "s %9s %-3s%s", name, number(), unit, verdict)
                .stripTrailing();
    }

    private String number() {
        return String.format(Locale.ROOT, unit.isEmpty() ? "%.3f" : "%.0f", value);
    }

    private static String trimmed(double value) {
        return value == Math.rint(value) ? String.format(Locale.ROOT, "%.0f", value) : Double.toString(value);
    }

    /** One figure a line, in columns. */
    static String table(String heading, List<Figure> figures) {
        int width = figures.stream()
                .mapToInt(figure -> figure.name().length())
                .max()
                .orElse(0);
        StringBuilder table = new StringBuilder(heading).append('\n');
        figures.forEach(figure -> table.append(figure.line(width)).append('\n'));
        return table.toString();
    }
}
