/** Joins the stages: sources in, judged networks out. No input or output of its own. */
@NullMarked
package loadmark.study;

import org.jspecify.annotations.NullMarked;
