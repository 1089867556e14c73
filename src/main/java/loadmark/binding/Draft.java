package loadmark.binding;

import java.util.List;
import java.util.Map;
import loadmark.diagnostic.Span;
import loadmark.network.Load;
import loadmark.network.Node;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;
import loadmark.syntax.Statement;

/**
 * The network as bound so far, with the places of everything in the file, for the checks of how it
 * hangs together.
 *
 * @param wired where each part stands in a wire, by name
 * @param portLines the statements of the ports, by name
 * @param loadLines the statements of the loads, by name
 */
record Draft(
    Nodes nodes,
    List<Part> parts,
    Map<String, Wiring.Place> wired,
    List<Supply> supplies,
    List<Port> ports,
    Map<String, Statement.Port> portLines,
    List<Load> loads,
    Map<String, Statement.Load> loadLines) {

  Span placeOf(Part part) {
    Wiring.Place place = wired.get(part.name());
    if (place == null) {
      throw new IllegalArgumentException("not wired: " + part.name());
    }
    return place.span();
  }

  Statement.Port lineOf(Port port) {
    Statement.Port line = portLines.get(port.name());
    if (line == null) {
      throw new IllegalArgumentException("no such port: " + port.name());
    }
    return line;
  }

  Statement.Load lineOf(Load load) {
    Statement.Load line = loadLines.get(load.name());
    if (line == null) {
      throw new IllegalArgumentException("no such load: " + load.name());
    }
    return line;
  }

  /** Where a load names one of its nodes. */
  Span placeOf(Load load, Node node) {
    Statement.NodePair pair = lineOf(load).nodes();
    return pair.plus().text().equals(node.name()) ? pair.plus().span() : pair.minus().span();
  }

  /** Where a port names one of its nodes. */
  Span placeOf(Port port, Node node) {
    Statement.NodePair pair = lineOf(port).nodes();
    return pair.plus().text().equals(node.name()) ? pair.plus().span() : pair.minus().span();
  }
}
