package sill.study;

import java.util.Objects;

/**
 * An input that varies; one whose limits are equal is held.
 *
 * @param name what the findings call it
 * @param nominal its nominal value, in coherent SI, within the limits
 * @param low its lower limit, finite
 * @param high its upper limit, finite
 * @param spread how it spreads; {@link Spread.Normal} needs the nominal value in the middle of the limits (to 1e-9 of
 *     their distance)
 */
public record Varied(String name, double nominal, double low, double high, Spread spread) {
    /** How far from the middle, as a fraction of the distance of the limits, rounding may have moved a nominal value. */
    private static final double OFF_CENTRE = 1e-9;

    public Varied {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(spread, "spread");
        if (!(Double.isFinite(low) && Double.isFinite(high))) {
            throw new IllegalArgumentException("limits of \"" + name + "\" must be finite, got " + low + " .. " + high);
        }
        if (!Double.isFinite(high - low)) {
            throw new IllegalArgumentException(
                    "limits of \"" + name + "\" must be finite and so must their distance, got " + low + " .. " + high);
        }
        if (!(low <= nominal && nominal <= high)) {
            throw new IllegalArgumentException(
                    "nominal value of \"" + name + "\" must lie within " + low + " .. " + high + ", got " + nominal);
        }
        if (spread instanceof Spread.Normal) {
            double rounding = 2 * (Math.ulp(low) + Math.ulp(high));
            if (Math.abs((high - nominal) - (nominal - low)) > Math.max(OFF_CENTRE * (high - low), rounding)) {
                throw new IllegalArgumentException("limits of \"" + name
                        + "\" must lie evenly about the nominal value for a normal spread, got " + nominal + " in "
                        + low
                        + " .. " + high);
            }
        }
    }

    /** Distance of the limits. */
    double width() {
        return high - low;
    }

    /** Whether it varies at all. */
    boolean free() {
        return low < high;
    }

    /**
     * The standard deviation of the spread: JCGM 100:2008 4.3.7 for a uniform one; for a triangular one with limits a, b and
     * mode c the root of (a² + b² + c² − ab − ac − bc) / 18, here written with distances, which don't cancel.
     */
    double standardDeviation() {
        if (spread instanceof Spread.Normal normal) {
            return width() / (2 * normal.k());
        } else if (spread instanceof Spread.Triangular) {
            double below = nominal - low;
            double above = high - nominal;
            return Math.sqrt((below * below + above * above + below * above) / 18);
        }
        return width() / Math.sqrt(12);
    }
}
