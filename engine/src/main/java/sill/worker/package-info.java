/**
 * The worker: a process of its own that translates a sheet, evaluates its class once through JShell and calls its cells in
 * order, and the parent's side of it. {@link sill.worker.SheetRun} is the way in: it starts workers, watches their time,
 * starts anew after a stop, and answers with a {@link sill.values.RunResult} in any case.
 *
 * <p>{@code jdk.jshell} is used here and nowhere else. What crosses between the processes is length-prefixed data, written
 * and read by {@link sill.worker.WireOut} and {@link sill.worker.WireIn}; no objects are serialised.
 */
package sill.worker;
