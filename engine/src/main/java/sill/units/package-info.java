/**
 * Units and dimensions. {@link sill.units.Unit} is the type to start at: it reads a unit symbol and converts numbers to coherent
 * SI. {@link sill.units.Dimension} is the algebra behind it, and {@link sill.units.Notation} writes numbers with units by the
 * rules of the SI brochure. What unit an expression of Java has is not found out here.
 */
package sill.units;
