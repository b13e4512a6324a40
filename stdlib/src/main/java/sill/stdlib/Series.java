package sill.stdlib;

import java.math.BigDecimal;
import java.util.stream.IntStream;

/**
 * The preferred number series E3 to E192 of IEC 60063:2015. A series holds the same digits in every decade, so it serves
 * resistances in Ω as well as capacitances in F; a result has the unit of what was asked.
 *
 * <p>A number within 1e-9 of a preferred number, relative to it, counts as that number: a computed 4700.000000001 is 4700.
 * Numbers are taken from 1e-300 to 1e300.
 */
public enum Series {
    /** Three a decade. */
    E3(3),
    /** Six a decade, customary for parts of ±20 %. */
    E6(6),
    /** Twelve a decade, customary for parts of ±10 %. */
    E12(12),
    /** 24 a decade, customary for parts of ±5 %. */
    E24(24),
    /** 48 a decade, customary for parts of ±2 %. */
    E48(48),
    /** 96 a decade, customary for parts of ±1 %. */
    E96(96),
    /** 192 a decade, customary for parts of ±0.5 % and better. */
    E192(192);

    private static final double SAME = 1e-9;
    private static final double LEAST = 1e-300;
    private static final double MOST = 1e300;

    /** The decade from 1 to 10, in hundredths. */
    private final int[] hundredths;

    Series(int size) {
        hundredths = size <= 24 ? every(24 / size, coarse()) : every(192 / size, fine());
    }

    /**
     * The preferred number nearest to {@code x} by ratio; of two equally near, the lower.
     *
     * @param x positive and finite, in any unit
     * @return a preferred number, in the unit of {@code x}
     * @throws IllegalArgumentException when {@code x} breaks its rule
     */
    @Unit("?")
    public double nearest(@Unit("?") double x) {
        int below = last(checked("x", x));
        double low = number(below);
        double high = number(below + 1);
        return x / low <= high / x ? low : high;
    }

    /**
     * The smallest preferred number that is not below {@code x}.
     *
     * @param x positive and finite, in any unit
     * @return a preferred number, in the unit of {@code x}
     * @throws IllegalArgumentException when {@code x} breaks its rule
     */
    @Unit("?")
    public double atLeast(@Unit("?") double x) {
        return number(first(checked("x", x)));
    }

    /**
     * The largest preferred number that is not above {@code x}.
     *
     * @param x positive and finite, in any unit
     * @return a preferred number, in the unit of {@code x}
     * @throws IllegalArgumentException when {@code x} breaks its rule
     */
    @Unit("?")
    public double atMost(@Unit("?") double x) {
        return number(last(checked("x", x) * (1 + SAME)));
    }

    /**
     * All preferred numbers from {@code low} to {@code high}, both included.
     *
     * @param low positive and finite, in any unit
     * @param high not below {@code low}, in the same unit
     * @return the preferred numbers in ascending order, in that unit; none when there is none
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Unit("?")
    public double[] between(@Unit("?") double low, @Unit("?") double high) {
        Arguments.atMost("low", checked("low", low), "high", checked("high", high), "");
        return IntStream.rangeClosed(first(low), last(high * (1 + SAME)))
                .mapToDouble(this::number)
                .toArray();
    }

    /** The preferred number at a place counted over all decades; place 0 is 1. */
    double number(int place) {
        int digits = hundredths[Math.floorMod(place, hundredths.length)];
        // A decimal, so that the double is the one a literal such as 4.7e-9 gives.
        return BigDecimal.valueOf(digits, 2 - Math.floorDiv(place, hundredths.length))
                .doubleValue();
    }

    /** The place of the largest preferred number not above {@code x}, without allowance. */
    private int last(double x) {
        int place = (int) Math.floor(StrictMath.log10(x) * hundredths.length);
        while (number(place) > x) {
            place--;
        }
        while (number(place + 1) <= x) {
            place++;
        }
        return place;
    }

    /** The place of the smallest preferred number not below {@code x}, with allowance. */
    private int first(double x) {
        double least = x * (1 - SAME);
        int place = last(least);
        return number(place) < least ? place + 1 : place;
    }

    private static double checked(String name, double x) {
        return Arguments.within(name, Arguments.positive(name, x, ""), "", LEAST, MOST, "");
    }

    private static int[] every(int stride, int[] all) {
        return IntStream.range(0, all.length / stride).map(i -> all[i * stride]).toArray();
    }

    /** E24, which older practice shaped: eight of its numbers are not the rounded powers. */
    private static int[] coarse() {
        return new int[] {
            100, 110, 120, 130, 150, 160, 180, 200, 220, 240, 270, 300, 330, 360, 390, 430, 470, 510, 560, 620, 680,
            750, 820, 910
        };
    }

    /** E192: the 192nd roots of ten, rounded to three digits; IEC 60063 prints 9.20 where rounding gives 9.19. */
    private static int[] fine() {
        return IntStream.range(0, 192)
                .map(i -> i == 185 ? 920 : (int) Math.round(100 * StrictMath.pow(10, i / 192.0)))
                .toArray();
    }
}
