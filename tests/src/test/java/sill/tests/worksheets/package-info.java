/**
 * The designs in {@code worksheets/}, each run as a user runs it: by the command line. Start at {@code Design}, the list of
 * them; the figures that their records must agree with stand in {@code worksheets/figures.txt} of the test resources.
 */
package sill.tests.worksheets;
