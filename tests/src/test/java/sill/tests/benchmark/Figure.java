package sill.tests.benchmark;

import java.util.List;
import java.util.Locale;

/**
 * A line of the benchmark's table.
 *
 * @param name what was measured
 * @param value the figure
 * @param unit its unit; empty for a ratio
 * @param aim what it shall not exceed; NaN when nothing is asked of it
 */
record Figure(String name, double value, String unit, double aim) {
    private String line(int width) {
        String verdict = Double.isNaN(aim)
                ? ""
                : String.format(
                        Locale.ROOT, "   aim: at most %s %s", trimmed(aim), value <= aim ? "(reached)" : "(MISSED)");
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
