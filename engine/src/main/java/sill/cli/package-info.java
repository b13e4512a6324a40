/**
 * The commands. {@link sill.cli.Main} reads the command line; each command is a class here. Only this package prints.
 */
package sill.cli;
