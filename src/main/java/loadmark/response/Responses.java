package loadmark.response;

import java.util.List;
import loadmark.equation.Equations;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;

/** Makes a network's port ready to be judged. */
public final class Responses {
  private Responses() {}

  /** The response of one port of the network, every other port closed. */
  public static PortResponse of(Network network, Port port) {
    boolean found = false;
    for (Port own : network.ports()) {
      found |= own.name().equals(port.name());
    }
    if (!found) {
      throw new IllegalArgumentException("no port " + port.name() + " in " + network.title());
    }
    Equations equations = Equations.of(network, port, false);
    Equations atDc = Equations.of(network, port, true);
    return new PortResponse() {
      @Override
      public Comparison compare(List<Load> loads, List<Load> against) {
        return new SolvedComparison(equations, atDc, List.copyOf(loads), List.copyOf(against));
      }

      @Override
      public Crossings crossings(List<Load> loads, List<Load> against) {
        return Crossings.of(network, port, loads, against);
      }
    };
  }
}
