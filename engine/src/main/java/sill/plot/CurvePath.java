package sill.plot;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import sill.stdlib.Plot;

/** A curve on the drawing: its points placed in the frame, thinned out, as SVG path data. */
final class CurvePath {
    private static final double ARROW_ON_STRAIGHT = 36;
    private static final double ARROW_EVERY = 130;

    private final StringBuilder path = new StringBuilder();
    private final StringBuilder arrows = new StringBuilder();
    private int hidden;

    /**
     * Places a curve.
     *
     * @param most about how many points may be drawn
     * @param marker path of a marker about its centre, for points alone
     */
    CurvePath(Plot.Curve curve, Frame frame, int most, String marker) {
        List<double[][]> runs = runs(curve, frame);
        if (curve.style() == Plot.Style.POINTS || runs.size() > most / 4) {
            addPoints(runs, most, marker);
            return;
        }
        double column = Math.max(1, 4 * frame.width() / most);
        int total = runs.stream().mapToInt(run -> run[0].length).sum();
        for (double[][] run : runs) {
            int share = Math.max(8, (int) ((long) most * run[0].length / Math.max(1, total)));
            addLine(run[0], run[1], Decimation.line(run[0], run[1], column, share), curve.arrow());
        }
    }

    /** The path of the line or of all markers. */
    String path() {
        return path.toString();
    }

    /** The path of the arrowheads; empty when there are none. */
    String arrows() {
        return arrows.toString();
    }

    /** How many finite points the axes cannot show, such as zero on a logarithmic axis. */
    int hidden() {
        return hidden;
    }

    /** The curve's unbroken stretches as abscissas and ordinates on the drawing. */
    private List<double[][]> runs(Plot.Curve curve, Frame frame) {
        double[] xs = curve.x();
        double[] ys = curve.y();
        boolean step = curve.style() == Plot.Style.STEP;
        List<double[][]> runs = new ArrayList<>();
        double[] px = new double[2 * xs.length];
        double[] py = new double[2 * xs.length];
        int count = 0;
        for (int i = 0; i <= xs.length; i++) {
            boolean shown = i < xs.length
                    && AxisRange.shows(frame.x().scale(), xs[i])
                    && AxisRange.shows(frame.y().scale(), ys[i]);
            if (shown) {
                double x = frame.px(xs[i]);
                if (step && count > 0) {
                    px[count] = x;
                    py[count] = py[count - 1];
                    count++;
                }
                px[count] = x;
                py[count] = frame.py(ys[i]);
                count++;
                continue;
            }
            if (i < xs.length && Double.isFinite(xs[i]) && Double.isFinite(ys[i])) {
                hidden++;
            }
            if (count > 0) {
                runs.add(new double[][] {Arrays.copyOf(px, count), Arrays.copyOf(py, count)});
                count = 0;
            }
        }
        return runs;
    }

    private void addPoints(List<double[][]> runs, int most, String marker) {
        double[] x = runs.stream().flatMapToDouble(run -> Arrays.stream(run[0])).toArray();
        double[] y = runs.stream().flatMapToDouble(run -> Arrays.stream(run[1])).toArray();
        for (int i : Decimation.points(x, y, most)) {
            Px.write(path, 'M', x[i], y[i]).append(marker);
        }
    }

    private void addLine(double[] x, double[] y, int[] kept, boolean arrow) {
        double sinceArrow = ARROW_EVERY / 2;
        Px.write(path, 'M', x[kept[0]], y[kept[0]]);
        if (kept.length == 1) {
            // With round ends a line of no length is a dot.
            path.append("h0");
        }
        for (int i = 1; i < kept.length; i++) {
            double fromX = x[kept[i - 1]];
            double fromY = y[kept[i - 1]];
            double toX = x[kept[i]];
            double toY = y[kept[i]];
            Px.write(path, 'L', toX, toY);
            if (!arrow) {
                continue;
            }
            double length = StrictMath.hypot(toX - fromX, toY - fromY);
            if (length >= ARROW_ON_STRAIGHT) {
                // Before the middle, so that the way back over the same line has its arrow elsewhere.
                addArrow(fromX + 0.4 * (toX - fromX), fromY + 0.4 * (toY - fromY), toX - fromX, toY - fromY);
                sinceArrow = 0;
            } else if (sinceArrow + length >= ARROW_EVERY && length > 0) {
                addArrow(toX, toY, toX - fromX, toY - fromY);
                sinceArrow = 0;
            } else {
                sinceArrow += length;
            }
        }
    }

    private void addArrow(double x, double y, double alongX, double alongY) {
        double length = StrictMath.hypot(alongX, alongY);
        double ux = alongX / length;
        double uy = alongY / length;
        arrows.append(Px.at('M', x + 6 * ux, y + 6 * uy))
                .append(Px.at('L', x - 5 * ux - 4.5 * uy, y - 5 * uy + 4.5 * ux))
                .append(Px.at('L', x - 5 * ux + 4.5 * uy, y - 5 * uy - 4.5 * ux))
                .append('z');
    }
}
