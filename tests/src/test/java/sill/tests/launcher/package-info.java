/**
 * The start script {@code engine/sill}, run as a person runs it but in a house made for the test: {@link
 * sill.tests.launcher.House} is a folder with the script and stand-ins for a JDK and for Maven. Start reading at
 * {@code FindingJavaTest}.
 */
package sill.tests.launcher;
