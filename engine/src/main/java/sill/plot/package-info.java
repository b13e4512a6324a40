/**
 * A {@link sill.stdlib.Plot} as SVG: {@link sill.plot.PlotDrawing#svg} is the one way in. The drawing is made of plain
 * numbers, never of a machine's fonts or locale, so a plot is the same bytes everywhere. {@link sill.plot.Px} and
 * {@link sill.plot.TextWidth} serve other drawings too.
 */
package sill.plot;
