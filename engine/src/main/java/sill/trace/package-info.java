/**
 * What rests on what: {@link sill.trace.Trace} links the givens, results, plots and checks of a record, and
 * {@link sill.trace.TraceDrawing} draws them as layers from left to right. Nothing here knows the record or the compiler.
 */
package sill.trace;
