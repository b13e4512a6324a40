package sill.plot;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import sill.stdlib.Plot;

/**
 * The marks along an axis: at round numbers, so that a reader can interpolate.
 *
 * @param unit in which their numbers are written
 * @param labelled those with a number
 * @param between those without
 */
record Ticks(AxisUnit unit, List<Tick> labelled, List<Double> between) {
    /** From here on a logarithmic axis writes powers of ten. */
    private static final double MANY_DECADES = 4;

    /** Below this a logarithmic axis is divided like a linear one: it holds too few of 1, 2 and 5. */
    private static final double FEW_DECADES = 0.8;

    private static final double END = 1e-9;

    /** A mark with its number. */
    record Tick(double value, String text) {}

    /** The marks of a range, about {@code wanted} of them with numbers. */
    static Ticks along(AxisRange range, String unit, int wanted) {
        if (range.scale() == Plot.Scale.LOGARITHMIC && range.decades() >= FEW_DECADES) {
            return logarithmic(range, unit, wanted);
        }
        return linear(range, AxisUnit.forLargest(unit, range.largest()), wanted);
    }

    /** The marks of a horizontal axis: as many as have room for their numbers. */
    static Ticks within(AxisRange range, String unit, double width) {
        for (int wanted = 7; ; wanted--) {
            Ticks ticks = along(range, unit, wanted);
            double space = TextWidth.of("00");
            double needed = ticks.labelled().stream()
                    .mapToDouble(tick -> TextWidth.of(tick.text()) + space)
                    .sum();
            if (needed <= width || wanted == 1) {
                return ticks;
            }
        }
    }

    private static Ticks linear(AxisRange range, AxisUnit unit, int wanted) {
        double rough = (range.high() - range.low()) / wanted;
        int exponent = AxisUnit.decimalExponent(rough);
        double lead = new BigDecimal(rough).scaleByPowerOfTen(-exponent).doubleValue();
        // The nearest of 1, 2, 5 and 10 by ratio: the limits are the geometric means.
        int first = lead < 1.414 ? 1 : lead < 3.162 ? 2 : lead < 7.071 ? 5 : 10;
        BigDecimal step = BigDecimal.valueOf(first).scaleByPowerOfTen(exponent);
        int parts = first == 2 ? 4 : 5;
        int decimals = Math.max(0, unit.exponent() - exponent - (first == 10 ? 1 : 0));
        BigDecimal fine = step.divide(BigDecimal.valueOf(parts));

        List<Tick> labelled = new ArrayList<>();
        List<Double> between = new ArrayList<>();
        BigDecimal count = new BigDecimal(range.low()).divide(fine, 0, RoundingMode.FLOOR);
        for (BigDecimal value = count.multiply(fine); ; value = value.add(fine)) {
            // An end that is a round number but for its last bit still gets its mark.
            double place = range.fraction(value.doubleValue());
            if (place < -END) {
                continue;
            }
            if (place > 1 + END) {
                break;
            }
            if (value.remainder(step).signum() == 0) {
                labelled.add(new Tick(value.doubleValue(), unit.number(value, decimals)));
            } else {
                between.add(value.doubleValue());
            }
        }
        return new Ticks(unit, labelled, between);
    }

    private static Ticks logarithmic(AxisRange range, String unit, int wanted) {
        boolean powers = range.decades() >= MANY_DECADES;
        AxisUnit axisUnit = powers ? AxisUnit.unprefixed(unit) : AxisUnit.forLargest(unit, range.high());
        int every = Math.max(1, (int) Math.ceil(range.decades() / wanted));
        boolean halves = range.decades() < 2.5;

        List<Tick> labelled = new ArrayList<>();
        List<Double> between = new ArrayList<>();
        int last = AxisUnit.decimalExponent(range.high());
        for (int exponent = AxisUnit.decimalExponent(range.low()); exponent <= last + 1; exponent++) {
            for (int digit = 1; digit <= 9; digit++) {
                BigDecimal exact = BigDecimal.valueOf(digit).scaleByPowerOfTen(exponent);
                double value = exact.doubleValue();
                if (value < range.low() || value > range.high()) {
                    continue;
                }
                boolean decade = digit == 1 && Math.floorMod(exponent, every) == 0;
                if (decade || halves && (digit == 1 || digit == 2 || digit == 5)) {
                    String text = powers
                            ? AxisUnit.power(exponent)
                            : axisUnit.number(exact, Math.max(0, axisUnit.exponent() - exponent));
                    labelled.add(new Tick(value, text));
                } else if (every == 1 || digit == 1) {
                    between.add(value);
                }
            }
        }
        return new Ticks(axisUnit, labelled, between);
    }
}
