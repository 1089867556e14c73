/** The immutable network: nodes, parts, ports, loads, cases, limits, sweep. No numerics. */
@NullMarked
package loadmark.network;

import org.jspecify.annotations.NullMarked;
