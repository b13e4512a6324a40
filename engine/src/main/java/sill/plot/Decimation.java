package sill.plot;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.IntStream;

/**
 * Thins out the points of a long curve so that the drawing looks the same: of the points that fall into one narrow column
 * the first, the lowest, the highest and the last stay. No spike is lost, however short.
 */
final class Decimation {
    private Decimation() {}

    /**
     * Thins out a line.
     *
     * @param x abscissas on the drawing
     * @param y ordinates, same length
     * @param column width of a column on the drawing, positive
     * @param most about how many points may stay, at least 8
     * @return the indices of the points that stay, rising
     */
    static int[] line(double[] x, double[] y, double column, int most) {
        if (x.length <= most) {
            return IntStream.range(0, x.length).toArray();
        }
        int[] kept = new int[x.length];
        int count = 0;
        int from = 0;
        while (from < x.length) {
            double place = Math.floor(x[from] / column);
            int to = from + 1;
            while (to < x.length && Math.floor(x[to] / column) == place) {
                to++;
            }
            count = keep(kept, count, extremes(y, from, to), from, to - 1);
            from = to;
        }
        if (count <= most) {
            return Arrays.copyOf(kept, count);
        }
        return blocks(x, y, most);
    }

    /** For curves that run to and fro: equal numbers of points, of which the extremes in both directions stay. */
    private static int[] blocks(double[] x, double[] y, int most) {
        int[] kept = new int[most + 6];
        int size = (int) Math.ceil(6.0 * x.length / most);
        int count = 0;
        for (int from = 0; from < x.length; from += size) {
            int to = Math.min(x.length, from + size);
            int[] highs = extremes(y, from, to);
            int[] sides = extremes(x, from, to);
            count = keep(kept, count, highs, from, to - 1, sides[0], sides[1]);
        }
        return Arrays.copyOf(kept, count);
    }

    private static int[] extremes(double[] values, int from, int to) {
        int lowest = from;
        int highest = from;
        for (int i = from + 1; i < to; i++) {
            lowest = values[i] < values[lowest] ? i : lowest;
            highest = values[i] > values[highest] ? i : highest;
        }
        return new int[] {lowest, highest};
    }

    private static int keep(int[] kept, int count, int[] extremes, int... others) {
        int[] all = Arrays.copyOf(extremes, extremes.length + others.length);
        System.arraycopy(others, 0, all, extremes.length, others.length);
        Arrays.sort(all);
        int end = count;
        for (int index : all) {
            if (end == 0 || kept[end - 1] != index) {
                kept[end++] = index;
            }
        }
        return end;
    }

    /**
     * Thins out points that are not joined: of those in one small square the first stays.
     *
     * @return the indices of at most {@code most} points, rising
     */
    static int[] points(double[] x, double[] y, int most) {
        for (double side = 0.5; ; side *= 1.5) {
            Map<Long, Integer> squares = new LinkedHashMap<>();
            for (int i = 0; i < x.length && squares.size() <= most; i++) {
                long square = ((long) Math.floor(x[i] / side) << 32) + (long) Math.floor(y[i] / side);
                squares.putIfAbsent(square, i);
            }
            if (squares.size() <= most) {
                return squares.values().stream().mapToInt(Integer::intValue).toArray();
            }
        }
    }
}
