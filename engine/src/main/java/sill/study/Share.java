package sill.study;

/**
 * How many samples lie inside limits. Those that are not finite count as outside.
 *
 * @param window the limits
 * @param inside how many lie inside
 * @param share that over all samples
 * @param lowerBound the lower 95 % confidence bound (one-sided, exact binomial) of the share
 */
public record Share(Window window, long inside, double share, double lowerBound) {}
