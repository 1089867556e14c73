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

/** A network drawn part by part; its port goes from the first node made to ground. */
final class Sketch {
  private final List<Node> nodes = new ArrayList<>();
  private final List<Part> parts = new ArrayList<>();
  private final List<Load> loads = new ArrayList<>();

  Sketch() {
    nodes.add(new Node(0, "ground"));
  }

  Node ground() {
    return nodes.get(0);
  }

  Node node() {
    Node node = new Node(nodes.size(), "n" + nodes.size());
    nodes.add(node);
    return node;
  }

  Sketch part(Node a, Node b, OnePort value) {
    String name = "p" + parts.size();
    parts.add(new Part(name, "impedance", a, b, value, "", OptionalDouble.empty(), 1));
    return this;
  }

  Sketch resistor(Node a, Node b, double ohm) {
    return part(a, b, OnePort.of(ElementKind.RESISTANCE, ohm));
  }

  Sketch capacitor(Node a, Node b, double farad) {
    return part(a, b, OnePort.of(ElementKind.CAPACITANCE, farad));
  }

  Sketch inductor(Node a, Node b, double henry) {
    return part(a, b, OnePort.of(ElementKind.INDUCTANCE, henry));
  }

  Sketch shunt(Node a, Node b, OnePort value) {
    return load(Load.Placement.SHUNT, a, b, value);
  }

  Sketch series(Node a, Node b, OnePort value) {
    return load(Load.Placement.SERIES, a, b, value);
  }

  private Sketch load(Load.Placement placement, Node a, Node b, OnePort value) {
    loads.add(new Load("load" + loads.size(), placement, a, b, value, "", loads.size() + 1));
    return this;
  }

  Network network() {
    Port port = new Port("input", nodes.get(1), nodes.get(0), new Port.Closure.Open(), 1);
    return new Network(
        "", nodes, parts, List.of(), List.of(port), loads, List.of(), List.of(), Optional.empty());
  }
}
