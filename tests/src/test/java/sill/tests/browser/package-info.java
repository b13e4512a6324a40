/** A record's page in a real browser and before the Nu HTML validator: what a reader's machine makes of it. */
package sill.tests.browser;
