/** Judgements to text, JSON and CSV, curves to these and to the Touchstone open format. */
@NullMarked
package loadmark.report;

import org.jspecify.annotations.NullMarked;
