/**
 * Syntax tree to network. Every finding about meaning is made here, before any number is computed.
 */
@NullMarked
package loadmark.binding;

import org.jspecify.annotations.NullMarked;
