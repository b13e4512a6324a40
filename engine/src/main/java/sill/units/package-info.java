/**
 * Units and dimensions: reading unit symbols, and writing numbers with units by the rules of the SI brochure.
 * {@link sill.units.Unit} is the type to start at.
 */
package sill.units;
