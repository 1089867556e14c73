/** Limits to bands, worst cases and verdicts. */
@NullMarked
package loadmark.judge;

import org.jspecify.annotations.NullMarked;
