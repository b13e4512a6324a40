/**
 * Worksheet text to cells. {@link sill.worksheet.Worksheet#parse} is the one way in; everything it returns is immutable.
 * What is wrong in the text comes back as {@link sill.worksheet.Problem}s, all of them at once. No Java is compiled here.
 */
package sill.worksheet;
