/**
 * Cells to one Java class. {@link sill.sheet.Translation} is the way in: it parses the snippets of every cell, finds the
 * types that {@code var} leaves open, attributes the one class of the sheet and answers with a {@link
 * sill.sheet.TranslatedSheet}: the class's text, which cells can run, what every name rests on, and where each generated
 * line comes from.
 *
 * <p>The JDK's compiler tree API is used here and nowhere else. Nothing is loaded or run here: that is the worker's job.
 */
package sill.sheet;
