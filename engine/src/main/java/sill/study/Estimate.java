package sill.study;

/**
 * A figure from samples.
 *
 * @param value the figure
 * @param standardError its sampling error, as one standard deviation; not a number where the samples are too few for one
 * @param resolution the figure lies within this distance of what all samples sorted would give: 0 up to 1,048,576 samples and
 *     for means and deviations, beyond that the width of a counting cell
 */
public record Estimate(double value, double standardError, double resolution) {}
