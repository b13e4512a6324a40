/**
 * The rules of the house, held against the compiled classes and the folders: who may know whom, and where what lies. When
 * one of them fails, move the code, not the rule.
 */
package sill.tests.architecture;
