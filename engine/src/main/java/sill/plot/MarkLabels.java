package sill.plot;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Places the labels of marks so that none lies on another. */
final class MarkLabels {
    /** Height of a row of text. */
    static final double ROW = 17;

    private static final double GAP = 4;

    private MarkLabels() {}

    /**
     * A label like a flag on its line.
     *
     * @param at where its line stands
     * @param from left edge of the text
     * @param to right edge of the text
     * @param row row above the frame, from 0
     * @param text the text, shortened where it had to be
     * @param leftwards whether the text lies left of its line
     */
    record Flag(double at, double from, double to, int row, String text, boolean leftwards) {}

    /** A line that wants a label. */
    record Wanted(double at, String text) {}

    /**
     * Labels of vertical lines in rows above the frame, each beside the upward extension of its line.
     *
     * @param wanted lines with their abscissas
     * @param left left end of the space for text
     * @param right right end of the space for text
     */
    static List<Flag> above(List<Wanted> wanted, double left, double right) {
        double centre = (left + right) / 2;
        List<Wanted> leftHalf = new ArrayList<>();
        List<Wanted> rightHalf = new ArrayList<>();
        wanted.forEach(each -> (each.at() <= centre ? leftHalf : rightHalf).add(each));
        // Flags point to the middle, where there is room; those nearest to it take the lowest rows.
        leftHalf.sort(Comparator.comparingDouble(Wanted::at).reversed());
        rightHalf.sort(Comparator.comparingDouble(Wanted::at));
        List<Flag> placed = new ArrayList<>();
        for (Wanted each : leftHalf) {
            String text = TextWidth.fit(each.text(), right - each.at() - GAP);
            place(each.at(), each.at() + GAP, each.at() + GAP + TextWidth.of(text), text, false, placed);
        }
        for (Wanted each : rightHalf) {
            String text = TextWidth.fit(each.text(), each.at() - GAP - left);
            place(each.at(), each.at() - GAP - TextWidth.of(text), each.at() - GAP, text, true, placed);
        }
        return placed;
    }

    private static void place(double at, double from, double to, String text, boolean leftwards, List<Flag> placed) {
        int row = 0;
        while (!isFree(at, from, to, row, placed)) {
            row++;
        }
        placed.add(new Flag(at, from, to, row, text, leftwards));
    }

    private static boolean isFree(double at, double from, double to, int row, List<Flag> placed) {
        boolean above = true;
        boolean clear = true;
        for (Flag flag : placed) {
            above &= row > flag.row();
            boolean texts = flag.row() == row && from < flag.to() + GAP && flag.from() < to + GAP;
            boolean otherLine = row <= flag.row() && flag.at() > from - GAP && flag.at() < to + GAP;
            boolean ownLine = flag.row() <= row && at > flag.from() - GAP && at < flag.to() + GAP;
            clear &= !texts && !otherLine && !ownLine;
        }
        return clear || above;
    }

    /**
     * Ordinates of labels beside horizontal lines: as near to their lines as they can be without touching.
     *
     * @param lines ordinates of the lines
     * @return the labels' ordinates, in the order of {@code lines}
     */
    static double[] beside(double[] lines, double top, double bottom) {
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < lines.length; i++) {
            order.add(i);
        }
        order.sort(Comparator.comparingDouble(i -> lines[i]));
        double[] placed = lines.clone();
        double free = top;
        for (int i : order) {
            placed[i] = Math.max(lines[i], free);
            free = placed[i] + ROW;
        }
        double end = bottom;
        for (int k = order.size() - 1; k >= 0; k--) {
            int i = order.get(k);
            placed[i] = Math.min(placed[i], end);
            end = placed[i] - ROW;
        }
        return placed;
    }
}
