package sill.units;

/** Placeholder replaced by the units room: a vector of rational exponents. */
public final class Dimension {
    /** The dimension of a pure number. */
    public static final Dimension NONE = new Dimension();

    private Dimension() {}
}
