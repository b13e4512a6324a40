package sill.stdlib;

/**
 * Resistive dividers: {@code rTop} from the input to the output, {@code rBottom} from the output to 0 V. A resistance of
 * 0 Ω is an end of travel or a link and is allowed where a result remains.
 */
public final class Dividers {
    private Dividers() {}

    /**
     * The output voltage of a divider that nothing loads: {@code vIn · rBottom / (rTop + rBottom)}.
     *
     * @param vIn input voltage in V, finite, of either sign
     * @param rTop resistance from input to output in Ω, at least 0
     * @param rBottom resistance from output to 0 V in Ω, at least 0; not both 0
     * @return output voltage in V, between 0 V and {@code vIn}
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("vIn * rBottom / (rTop + rBottom)")
    @Unit("V")
    public static double output(@Unit("V") double vIn, @Unit("Ω") double rTop, @Unit("Ω") double rBottom) {
        Arguments.finite("vIn", vIn, "V");
        checkArms(rTop, rBottom);
        return vIn * rBottom / (rTop + rBottom);
    }

    /**
     * The output voltage of a divider with a load across {@code rBottom}: {@code vIn / (1 + rTop/rBottom + rTop/rLoad)}.
     *
     * @param vIn input voltage in V, finite, of either sign
     * @param rTop resistance from input to output in Ω, at least 0
     * @param rBottom resistance from output to 0 V in Ω, at least 0; not both 0
     * @param rLoad resistance of the load in Ω, above 0
     * @return output voltage in V, between 0 V and the output without the load
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("vIn / (1 + rTop / rBottom + rTop / rLoad)")
    @Unit("V")
    public static double output(
            @Unit("V") double vIn, @Unit("Ω") double rTop, @Unit("Ω") double rBottom, @Unit("Ω") double rLoad) {
        Arguments.finite("vIn", vIn, "V");
        checkArms(rTop, rBottom);
        Arguments.positive("rLoad", rLoad, "Ω");
        return vIn / (1 + rTop / rBottom + rTop / rLoad);
    }

    /**
     * The resistance that a load sees, by Thévenin: {@code rTop · rBottom / (rTop + rBottom)}. The input is a source
     * without resistance of its own.
     *
     * @param rTop resistance from input to output in Ω, at least 0
     * @param rBottom resistance from output to 0 V in Ω, at least 0; not both 0
     * @return source resistance in Ω, not above the smaller of the two
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("rTop * rBottom / (rTop + rBottom)")
    @Unit("Ω")
    public static double sourceResistance(@Unit("Ω") double rTop, @Unit("Ω") double rBottom) {
        checkArms(rTop, rBottom);
        return rTop * rBottom / (rTop + rBottom);
    }

    /**
     * Resistances in parallel: {@code 1 / (1/r₁ + 1/r₂ + …)}. One of 0 Ω shorts the others.
     *
     * @param r the resistances in Ω, one or more, each at least 0
     * @return their resistance together in Ω, not above the smallest of them
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula("1 / sum(1 / r)")
    @Unit("Ω")
    public static double parallel(@Unit("Ω") double... r) {
        if (r.length == 0) {
            throw new IllegalArgumentException("r must be one resistance or more, got none");
        }
        double conductance = 0;
        for (int i = 0; i < r.length; i++) {
            conductance += 1 / Math.abs(Arguments.notNegative("r[" + i + "]", r[i], "Ω"));
        }
        return 1 / conductance;
    }

    private static void checkArms(double rTop, double rBottom) {
        Arguments.notNegative("rTop", rTop, "Ω");
        Arguments.notNegative("rBottom", rBottom, "Ω");
        Arguments.positive("rTop + rBottom", rTop + rBottom, "Ω");
    }
}
