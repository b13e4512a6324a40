/**
 * Tolerance runs, as numerics alone: a {@link sill.study.Model} is repeated over the limits and spreads of its inputs.
 * Start at {@link sill.study.Study}, which carries out a {@link sill.study.StudyPlan} and gives one
 * {@link sill.study.Findings} for each studied output.
 *
 * <p>Nothing here knows worksheets, the compiler, units or the record: inputs and outputs are numbers in coherent SI,
 * and names are text that goes in and comes out. The same plan and the same model give the same figures to the last bit on
 * any number of cores: work is cut into numbered tasks of fixed size, and what they give is put together in the order of
 * the numbers.
 */
package sill.study;
