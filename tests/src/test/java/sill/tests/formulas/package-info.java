/**
 * Formulas as a reader of the page sees them. What is evaluated here is the MathML of the page, by an evaluator of its own
 * that shares no code with the engine's formulas.
 */
package sill.tests.formulas;
