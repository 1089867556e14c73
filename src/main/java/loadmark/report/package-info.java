/** Judgements to text, JSON and CSV. */
@NullMarked
package loadmark.report;

import org.jspecify.annotations.NullMarked;
