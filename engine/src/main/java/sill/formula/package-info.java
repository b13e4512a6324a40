/**
 * Formulas as a record prints them. {@link sill.formula.Expression} is what a line of Java means as mathematics, {@link
 * sill.formula.WorkingOut} puts the numbers in and holds them against the result, {@link sill.formula.MathWriter} writes
 * MathML.
 *
 * <p>Nothing here reads Java: that is the job of {@code sill.sheet}. What has no mathematics never becomes an expression, and
 * the record shows its source.
 */
package sill.formula;
