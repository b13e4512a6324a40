/**
 * Helpers that worksheets call. All {@code double} values are in coherent SI units; {@link sill.stdlib.Unit} says which,
 * {@link sill.stdlib.Formula} says what is computed.
 *
 * <p>{@link sill.stdlib.Comparators} is the class to start at, and the one to imitate. A helper is static, keeps nothing,
 * gives the same bits on every Java ({@code StrictMath} for functions that {@code Math} may round its own way), and
 * refuses arguments that make no sense. Not here: worksheets, tolerance runs, and how a {@link sill.stdlib.Plot} is drawn.
 */
package sill.stdlib;
