/**
 * What a run of the sheet leaves: {@link sill.values.RunResult}, with every value as plain {@link sill.values.Datum} data
 * that no longer depends on the worker that computed it.
 */
package sill.values;
