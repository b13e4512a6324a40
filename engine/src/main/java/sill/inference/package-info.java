/**
 * Dimensions by inference: what every value of a sheet measures, though the cells hold plain {@code double}s.
 * {@link sill.inference.Inference} is the way in; it walks the one attributed class of a sheet as if it ran it, with a
 * {@link sill.inference.Value} in the place of each number, and answers with the dimension of every field and check and
 * with the {@link sill.inference.Slip}s it met.
 *
 * <p>What is known comes from the givens' units, from {@code @Unit} on helpers, and from the units that captions state. A
 * bare number is a pure number, a bare 0 fits anything. What cannot be known is unknown: it passes silently, and all that
 * is made from it is unknown. So is the result of an operation that slipped, lest one slip tells of itself many times.
 *
 * <p>A variable's value depends on the place in the code: branches join, loops and recursion run until nothing changes.
 * A container is known by its elements, a map by its keys and values, a record by its components; a user's method by its
 * body, for the dimensions of each call's arguments. Aliases are not followed: a list that is filled under a second name
 * counts as empty under the first, and an element of an empty container fits anything.
 *
 * <p><b>Celsius.</b> A temperature given in °C is a number of kelvins in the cells, and so is a difference of two. Both have
 * the dimension K, and nothing here tells one from the other. Whether a result is shown in °C or in K is for its caption to say:
 * {@code [°C]} for a temperature, {@code [K]} for a difference.
 */
package sill.inference;
