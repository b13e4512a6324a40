/**
 * Words about words: quoting what was found in a message, and the known word nearest to a misspelled one.
 * {@link sill.words.Quoted} and {@link sill.words.NearestWord} are all there is; no package of Sill lies below this one.
 */
package sill.words;
