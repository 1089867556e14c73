/**
 * The tool from outside: texts in, reports out, held against values that do not come from it. What
 * a test expects is a published value, a closed form, or a slip that somebody made on purpose.
 */
@NullMarked
package loadmark.evidence;

import org.jspecify.annotations.NullMarked;
