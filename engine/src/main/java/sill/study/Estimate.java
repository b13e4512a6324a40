package sill.study;

/**
 * A figure from samples.
 *
 * @param value the figure
 * @param standardError its sampling error, as one standard deviation; not a number where the samples are too few for one
 */
public record Estimate(double value, double standardError) {}
