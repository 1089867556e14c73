/**
 * Text to syntax tree: sealed records with spans. Wrong text becomes findings in the project's own
 * words; one slip, one finding.
 */
@NullMarked
package loadmark.syntax;

import org.jspecify.annotations.NullMarked;
