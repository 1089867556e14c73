package loadmark.study;

import loadmark.diagnostic.SourceText;

/**
 * A file as it was read.
 *
 * @param sha256 the SHA-256 digest of its bytes, in lower-case hexadecimal
 */
public record Source(SourceText text, String sha256) {}
