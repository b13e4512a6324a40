package sill.stdlib;

/**
 * Trip points of a comparator with hysteresis. The comparator is ideal but for its two output levels: no current flows
 * into its inputs, and its output changes where they are equal. An offset is added to the reference. A pull-up adds to
 * {@code rFb} while the output is high: the trip point that is left in the high state is computed with it, the other
 * without.
 */
public final class Comparators {
    private Comparators() {}

    /**
     * The non-inverting form: the input comes through {@code rIn} to the non-inverting pin, {@code rFb} leads from the
     * output to the same pin, the reference stands on the inverting pin. The output is high above the band.
     *
     * <p>The pin is at {@code (vIn·rFb + vOut·rIn) / (rIn + rFb)}; the output changes where that equals {@code vRef}:
     *
     * <pre>
     * rising  = vRef·(1 + rIn/rFb) − vOutLow·rIn/rFb
     * falling = vRef·(1 + rIn/rFb) − vOutHigh·rIn/rFb
     * </pre>
     *
     * <p>The reference must lie within the output levels. Outside them the feedback pulls the pin to the same side of the
     * reference in both states: the band does not enclose the reference, and the trip points run away from it on one
     * side, which is a slip in the arguments far more often than a circuit.
     *
     * @param vRef reference voltage in V, within {@code vOutLow .. vOutHigh}
     * @param rIn resistance from the input to the pin in Ω, above 0
     * @param rFb resistance from the output to the pin in Ω, above 0
     * @param vOutLow output low level in V, below {@code vOutHigh}
     * @param vOutHigh output high level in V
     * @return the trip points, {@code rising ≥ vRef ≥ falling}
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula({
        "rising = vRef * (1 + rIn / rFb) - vOutLow * rIn / rFb",
        "falling = vRef * (1 + rIn / rFb) - vOutHigh * rIn / rFb"
    })
    public static TripPoints noninverting(
            @Unit("V") double vRef,
            @Unit("Ω") double rIn,
            @Unit("Ω") double rFb,
            @Unit("V") double vOutLow,
            @Unit("V") double vOutHigh) {
        Arguments.positive("rIn", rIn, "Ω");
        Arguments.positive("rFb", rFb, "Ω");
        Arguments.below("vOutLow", vOutLow, "vOutHigh", vOutHigh, "V");
        Arguments.within("vRef", vRef, "vOutLow .. vOutHigh", vOutLow, vOutHigh, "V");
        double reference = vRef * (1 + rIn / rFb);
        return new TripPoints(reference - vOutLow * rIn / rFb, reference - vOutHigh * rIn / rFb);
    }

    /**
     * The inverting form: the input stands on the inverting pin; from the other pin {@code rTop} leads to the supply,
     * {@code rBottom} to 0 V and {@code rFb} to the output. The output is low above the band.
     *
     * <p>The output changes where the input equals the other pin, which the output level {@code vOut} moves:
     *
     * <pre>
     * threshold = (vSupply/rTop + vOut/rFb) / (1/rTop + 1/rBottom + 1/rFb)
     * rising    = threshold at vOut = vOutHigh
     * falling   = threshold at vOut = vOutLow
     * </pre>
     *
     * <p>The threshold is a weighted mean of {@code vSupply}, 0 V and the output level. It cannot leave their span, so no
     * rule ties the supply to the output levels: the divider may hang on another supply than the comparator.
     *
     * @param vSupply voltage at the upper end of {@code rTop} in V, finite; 0 for a reference at 0 V
     * @param rTop resistance from the supply to the pin in Ω, above 0
     * @param rBottom resistance from the pin to 0 V in Ω, above 0
     * @param rFb resistance from the output to the pin in Ω, above 0
     * @param vOutLow output low level in V, below {@code vOutHigh}
     * @param vOutHigh output high level in V
     * @return the trip points
     * @throws IllegalArgumentException when an argument breaks its rule
     */
    @Formula({
        "rising = (vSupply / rTop + vOutHigh / rFb) / (1 / rTop + 1 / rBottom + 1 / rFb)",
        "falling = (vSupply / rTop + vOutLow / rFb) / (1 / rTop + 1 / rBottom + 1 / rFb)"
    })
    public static TripPoints inverting(
            @Unit("V") double vSupply,
            @Unit("Ω") double rTop,
            @Unit("Ω") double rBottom,
            @Unit("Ω") double rFb,
            @Unit("V") double vOutLow,
            @Unit("V") double vOutHigh) {
        Arguments.finite("vSupply", vSupply, "V");
        Arguments.positive("rTop", rTop, "Ω");
        Arguments.positive("rBottom", rBottom, "Ω");
        Arguments.positive("rFb", rFb, "Ω");
        Arguments.below("vOutLow", vOutLow, "vOutHigh", vOutHigh, "V");
        double conductance = 1 / rTop + 1 / rBottom + 1 / rFb;
        return new TripPoints(
                (vSupply / rTop + vOutHigh / rFb) / conductance, (vSupply / rTop + vOutLow / rFb) / conductance);
    }
}
