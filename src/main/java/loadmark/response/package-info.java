/** The driving-point impedance of a port with any set of loads, and the change that loads make. */
@NullMarked
package loadmark.response;

import org.jspecify.annotations.NullMarked;
