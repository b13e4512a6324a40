package sill.units;

/** The seven base units (SI brochure, 9th edition, table 2). */
public enum BaseUnit {
    /** Length. */
    METRE,
    /** Mass. */
    KILOGRAM,
    /** Time. */
    SECOND,
    /** Electric current. */
    AMPERE,
    /** Thermodynamic temperature. */
    KELVIN,
    /** Amount of substance. */
    MOLE,
    /** Luminous intensity. */
    CANDELA
}
