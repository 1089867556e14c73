package loadmark.network;

import java.util.Optional;

/**
 * A node held by a source: common for every impedance.
 *
 * @param behind the source's own impedance; without one the node is joined to ground
 */
public record Supply(Node node, double volts, Optional<OnePort> behind, int line) {}
