package sill.stdlib;

/** The one-pole low-pass filter: a resistance in series, a capacitance across the output. */
public final class Filters {
    private Filters() {}

    /**
     * The frequency at which the gain is {@code 1/√2}: {@code 1 / (2π·r·c)}.
     *
     * @param r resistance in Ω, above 0
     * @param c capacitance in F, above 0
     * @return cutoff frequency in Hz
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("1 / (2 * PI * r * c)")
    @Unit("Hz")
    public static double cutoff(@Unit("Ω") double r, @Unit("F") double c) {
        return 1 / (2 * Math.PI * timeConstant(r, c));
    }

    /**
     * The time constant: {@code r·c}.
     *
     * @param r resistance in Ω, above 0
     * @param c capacitance in F, above 0
     * @return time constant in s
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("r * c")
    @Unit("s")
    public static double timeConstant(@Unit("Ω") double r, @Unit("F") double c) {
        return Arguments.positive("r", r, "Ω") * Arguments.positive("c", c, "F");
    }

    /**
     * The magnitude of the gain for a sine: {@code 1 / √(1 + (2π·f·r·c)²)}.
     *
     * @param f frequency in Hz, at least 0
     * @param r resistance in Ω, above 0
     * @param c capacitance in F, above 0
     * @return output amplitude over input amplitude, from 1 down to 0
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("1 / sqrt(1 + pow(2 * PI * f * r * c, 2))")
    @Unit("1")
    public static double gain(@Unit("Hz") double f, @Unit("Ω") double r, @Unit("F") double c) {
        double ratio = 2 * Math.PI * Arguments.notNegative("f", f, "Hz") * timeConstant(r, c);
        return 1 / Math.sqrt(1 + ratio * ratio);
    }

    /**
     * The time from a step of the input until the output passes a level: {@code r·c·ln((vFinal − vStart)/(vFinal − v))}.
     *
     * @param r resistance in Ω, above 0
     * @param c capacitance in F, above 0
     * @param vStart output voltage in V at the step
     * @param vFinal voltage in V that the output nears, other than {@code vStart}
     * @param v level in V, from {@code vStart} on and short of {@code vFinal}, which is never reached
     * @return time in s, at least 0
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("r * c * log((vFinal - vStart) / (vFinal - v))")
    @Unit("s")
    public static double timeToReach(
            @Unit("Ω") double r,
            @Unit("F") double c,
            @Unit("V") double vStart,
            @Unit("V") double vFinal,
            @Unit("V") double v) {
        double timeConstant = timeConstant(r, c);
        Arguments.finite("vStart", vStart, "V");
        Arguments.finite("vFinal", vFinal, "V");
        if (vStart == vFinal) {
            throw Arguments.broken("vFinal", "other than vStart (" + vStart + " V)", vFinal, "V");
        }
        double travelled = (Arguments.finite("v", v, "V") - vStart) / (vFinal - vStart);
        if (!(travelled >= 0 && travelled < 1)) {
            String rule = "from vStart (" + vStart + " V) on and short of vFinal (" + vFinal + " V)";
            throw Arguments.broken("v", rule, v, "V");
        }
        // log1p keeps the digits of a level close to the start; it is not positive here.
        return timeConstant * Math.abs(StrictMath.log1p(-travelled));
    }

    /**
     * The bandwidth of the ideal low-pass filter that passes as much white noise: {@code π/2} times the cutoff frequency,
     * {@code 1 / (4·r·c)}.
     *
     * @param r resistance in Ω, above 0
     * @param c capacitance in F, above 0
     * @return noise bandwidth in Hz
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("1 / (4 * r * c)")
    @Unit("Hz")
    public static double noiseBandwidth(@Unit("Ω") double r, @Unit("F") double c) {
        return 1 / (4 * timeConstant(r, c));
    }
}
