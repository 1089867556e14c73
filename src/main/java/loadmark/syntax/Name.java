package loadmark.syntax;

import loadmark.diagnostic.Span;

/**
 * A name as written.
 *
 * @param text without quotes, in Unicode normalisation form C
 * @param quoted whether it stood in double quotes, so that it is never a word of the language
 */
public record Name(String text, boolean quoted, Span span) {}
