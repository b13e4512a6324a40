package sill.stdlib;

/**
 * The two trip points of a comparator with hysteresis: the input voltages at which its output changes.
 *
 * @param rising input voltage in V at which the output changes while the input rises
 * @param falling input voltage in V at which the output changes while the input falls; not above {@code rising}
 */
public record TripPoints(
        @Unit("V") double rising, @Unit("V") double falling) {
    /**
     * Trip points as measured or computed elsewhere; {@link Comparators} makes them from a circuit.
     *
     * @throws IllegalArgumentException when one is not finite, or {@code falling} is above {@code rising}
     */
    public TripPoints {
        Arguments.atMost("falling", falling, "rising", rising, "V");
    }

    /** The hysteresis band in V, at least 0: {@code rising − falling}. */
    @Formula("rising - falling")
    @Unit("V")
    public double band() {
        return rising - falling;
    }

    /** The middle of the band in V: {@code (rising + falling) / 2}. */
    @Formula("(rising + falling) / 2")
    @Unit("V")
    public double centre() {
        return (rising + falling) / 2;
    }
}
