package sill.study;

/**
 * A quantile of samples.
 *
 * @param probability the share of samples below, 0 to 1
 * @param estimate its value
 */
public record Quantile(double probability, Estimate estimate) {}
