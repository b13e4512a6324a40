/** Sill's engine: worksheet text to record. The rooms are the packages below; DEVELOPERS.md has the plan of the house. */
package sill;
