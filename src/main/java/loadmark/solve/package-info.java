/**
 * Numbers at frequencies: the elimination engine, the general path, and how well each was solved.
 */
@NullMarked
package loadmark.solve;

import org.jspecify.annotations.NullMarked;
