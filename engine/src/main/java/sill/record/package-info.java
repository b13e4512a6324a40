/**
 * The record of a run: {@link sill.record.DesignRecord} is its model, assembled from the worksheet and the run's result,
 * and written as JSON here and as a page by {@code sill.record.html}. Nothing here knows the compiler or the worker.
 */
package sill.record;
