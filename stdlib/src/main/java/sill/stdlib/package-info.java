/** Helpers that worksheets call. All {@code double} values are in coherent SI units. */
package sill.stdlib;
