package sill.record;

import java.util.Optional;
import java.util.regex.Pattern;
import sill.units.Notation;
import sill.units.Unit;
import sill.worksheet.Check.Limit;
import sill.worksheet.Check.Requirement;

/**
 * A requirement as the limits it sets.
 *
 * @param low lower limit, inclusive
 * @param high upper limit, inclusive
 * @param unit unit of the limits as written
 * @param shown the requirement in words and units
 */
record Window(Optional<Double> low, Optional<Double> high, Unit unit, String shown) {
    private static final Pattern ZEROS_AT_END =
            Pattern.compile("(?:\\.0+|(?<=\\.\\d{1,3})0+)(?=" + Notation.SPACE + ")");

    static Window of(Requirement requirement) {
        if (requirement instanceof Requirement.Within within) {
            return new Window(
                    Optional.of(within.low().value()),
                    Optional.of(within.high().value()),
                    within.low().unit(),
                    shown(within.low()) + " .. " + shown(within.high()));
        } else if (requirement instanceof Requirement.AtLeast least) {
            return new Window(
                    Optional.of(least.low().value()),
                    Optional.empty(),
                    least.low().unit(),
                    "≥" + Notation.SPACE + shown(least.low()));
        } else if (requirement instanceof Requirement.AtMost most) {
            return new Window(
                    Optional.empty(),
                    Optional.of(most.high().value()),
                    most.high().unit(),
                    "≤" + Notation.SPACE + shown(most.high()));
        } else if (requirement instanceof Requirement.EqualTo equal) {
            Unit unit = equal.value().unit();
            double value = equal.value().value();
            return new Window(
                    Optional.of(value - equal.distance()),
                    Optional.of(value + equal.distance()),
                    unit,
                    "=" + Notation.SPACE + shown(equal.value()) + " ±" + Notation.SPACE
                            + shownDistance(equal.distance(), distance(unit)));
        }
        return new Window(Optional.empty(), Optional.empty(), Unit.ONE, "holds");
    }

    /** Whether a value lies inside; one that is not a number does not. */
    boolean holds(double value) {
        return margin(value) >= 0;
    }

    /** From the value to the nearer limit, negative outside. */
    double margin(double value) {
        double below = low.map(limit -> value - limit).orElse(Double.POSITIVE_INFINITY);
        double above = high.map(limit -> limit - value).orElse(Double.POSITIVE_INFINITY);
        return Math.min(below, above);
    }

    /** The margin as a fraction of half the window, or of a single limit's size; nothing where that is 0. */
    Optional<Double> share(double margin) {
        double size = low.isPresent() && high.isPresent()
                ? (high.get() - low.get()) / 2
                : Math.abs(low.or(() -> high).orElse(0.0));
        boolean oneSided = low.isEmpty() || high.isEmpty();
        if (oneSided && unit.offset() != 0) {
            // A temperature's distance from absolute zero says nothing of a margin.
            return Optional.empty();
        }
        return size > 0 && Double.isFinite(margin) ? Optional.of(margin / size) : Optional.empty();
    }

    /** A margin with sign and unit. */
    String shownMargin(double margin) {
        return (margin > 0 ? "+" : "") + Notation.shown(margin, distance(unit));
    }

    private static Unit distance(Unit unit) {
        return unit.offset() == 0 ? unit : unit.coherent();
    }

    /** As typed, but for one so small that it would be zeros for the most part: that gets its prefix. */
    private static String shownDistance(double distance, Unit unit) {
        return distance == 0 || distance / unit.factor() >= 1e-4
                ? Notation.plain(distance, unit)
                : ZEROS_AT_END.matcher(Notation.shown(distance, unit)).replaceFirst("");
    }

    private static String shown(Limit limit) {
        return Notation.plain(limit.value(), limit.unit());
    }
}
