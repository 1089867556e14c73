/**
 * SI units, prefixes and IEC 60062 letter codes: reading values and writing them. Independent of
 * the default locale.
 */
@NullMarked
package loadmark.quantity;

import org.jspecify.annotations.NullMarked;
