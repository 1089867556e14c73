package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;

/** Builds networks for tests. Nodes go by their index; 0 is ground. */
public final class Circuit {
  private final List<Node> nodes = new ArrayList<>();
  private final List<Part> parts = new ArrayList<>();
  private final List<Supply> supplies = new ArrayList<>();
  private final List<Port> ports = new ArrayList<>();
  private final List<Load> loads = new ArrayList<>();

  public static OnePort r(double ohm) {
    return OnePort.of(ElementKind.RESISTANCE, ohm);
  }

  public static OnePort c(double farad) {
    return OnePort.of(ElementKind.CAPACITANCE, farad);
  }

  public static OnePort l(double henry) {
    return OnePort.of(ElementKind.INDUCTANCE, henry);
  }

  public static OnePort series(OnePort... members) {
    return OnePort.series(List.of(members));
  }

  public static OnePort parallel(OnePort... members) {
    return OnePort.parallel(List.of(members));
  }

  private Node node(int index) {
    while (nodes.size() <= index) {
      nodes.add(new Node(nodes.size(), "n" + nodes.size()));
    }
    return nodes.get(index);
  }

  public Circuit part(int a, int b, OnePort value) {
    String name = "p" + parts.size();
    OptionalDouble rated = OptionalDouble.empty();
    parts.add(new Part(name, "impedance", node(a), node(b), value, "", rated, 1));
    return this;
  }

  public Circuit shunt(int a, int b, OnePort value) {
    return load(Load.Placement.SHUNT, a, b, value);
  }

  public Circuit series(int a, int b, OnePort value) {
    return load(Load.Placement.SERIES, a, b, value);
  }

  private Circuit load(Load.Placement placement, int a, int b, OnePort value) {
    loads.add(new Load("load" + loads.size(), placement, node(a), node(b), value, "", 1));
    return this;
  }

  public Circuit port(int a, int b) {
    return port(a, b, new Port.Closure.Open());
  }

  public Circuit port(int a, int b, Port.Closure closure) {
    ports.add(new Port("port" + ports.size(), node(a), node(b), closure, 1));
    return this;
  }

  public Circuit supply(int node, Optional<OnePort> behind) {
    supplies.add(new Supply(node(node), 5, behind, 1));
    return this;
  }

  public List<Load> loads(int... which) {
    List<Load> chosen = new ArrayList<>();
    for (int i : which) {
      chosen.add(loads.get(i));
    }
    return chosen;
  }

  public Network network() {
    return new Network(
        "", nodes, parts, supplies, ports, loads, List.of(), List.of(), Optional.empty());
  }

  /** All loads on, against none. */
  public Comparison compare() {
    return compare(loads, List.of());
  }

  public Comparison compare(List<Load> with, List<Load> without) {
    return Responses.of(network(), ports.get(0)).compare(with, without);
  }
}
