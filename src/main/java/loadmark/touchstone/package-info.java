/**
 * Measured one- and two-port data in the Touchstone open format: text in, {@link
 * loadmark.touchstone.MeasuredData} out, and one-port impedances back to text. What is wrong with a
 * file becomes findings with their places in it. Version 1.1 (Touchstone File Format Specification,
 * 2002) and, of version 2.0 (IBIS Open Forum, 2009), files of one or two ports.
 */
@NullMarked
package loadmark.touchstone;

import org.jspecify.annotations.NullMarked;
