package loadmark.response;

import loadmark.network.Network;
import loadmark.network.Port;

/** Makes a network's port ready to be judged. */
public final class Responses {
  private Responses() {}

  /** The response of one port of the network, every other port closed. */
  public static PortResponse of(Network network, Port port) {
    if (!network.ports().contains(port)) {
      throw new IllegalArgumentException("no port " + port.name() + " in " + network.title());
    }
    return (loads, against) -> new DenseComparison(network, port, loads, against);
  }
}
