package sill.study;

/**
 * How a result depends on an input about the nominal point.
 *
 * @param given the input
 * @param slope derivative at the nominal point, in SI of the result per SI of the input; not a number where no finite
 *     difference was found within the limits
 * @param share fraction of the result's first-order variance that this input brings, 0 to 1
 */
public record Sensitivity(String given, double slope, double share) {}
