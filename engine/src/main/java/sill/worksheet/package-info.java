/**
 * Worksheet text to cells. {@link sill.worksheet.Worksheet#parse} is the one way in; everything it returns is immutable.
 * {@code spec/worksheet-text.txt} among the tests says with examples what every text means. {@link sill.worksheet.Trial}
 * overrides givens for one run.
 *
 * <p>What is wrong in the text comes back as {@link sill.worksheet.Problem}s, all of them at once. No Java is compiled here.
 */
package sill.worksheet;
