/**
 * Text into HTML and SVG without holes: {@link sill.markup.Markup} escapes whatever it is given, and
 * {@link sill.markup.VisibleText} shows characters that would otherwise hide or reorder what a reader sees.
 */
package sill.markup;
