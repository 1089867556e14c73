package loadmark;

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

/**
 * A ladder of alternating R and L series arms and C shunts, with a resistor to common at each third
 * node and 75 Ω at the end; port and load at the two ends.
 *
 * @param nodes how many there are beside the common one
 */
record Ladder(int nodes) {
  static final double END_OHM = 75;
  static final double LOAD_OHM = 1e6;
  static final double LOAD_FARAD = 12e-12;

  /** Whether the series arm from node i to i + 1 is a resistor; else it is an inductor. */
  boolean isResistor(int i) {
    return i % 2 == 1;
  }

  double seriesOhm(int i) {
    return 10 + i % 7;
  }

  double seriesHenry(int i) {
    return 1e-6 * (1 + i % 5);
  }

  double shuntFarad(int i) {
    return 1e-10 * (1 + i % 3);
  }

  boolean hasShuntResistor(int i) {
    return i % 3 == 0;
  }

  double shuntOhm(int i) {
    return 1e4 * (1 + i % 4);
  }

  Network network() {
    List<Node> all = new ArrayList<>();
    for (int i = 0; i <= nodes; i++) {
      all.add(new Node(i, "n" + i));
    }
    Node ground = all.get(0);
    List<Part> parts = new ArrayList<>();
    for (int i = 1; i <= nodes; i++) {
      Node node = all.get(i);
      if (i < nodes) {
        OnePort arm =
            isResistor(i)
                ? OnePort.of(ElementKind.RESISTANCE, seriesOhm(i))
                : OnePort.of(ElementKind.INDUCTANCE, seriesHenry(i));
        parts.add(part(parts.size(), node, all.get(i + 1), arm));
      }
      OnePort shunt = OnePort.of(ElementKind.CAPACITANCE, shuntFarad(i));
      parts.add(part(parts.size(), node, ground, shunt));
      if (hasShuntResistor(i)) {
        OnePort resistor = OnePort.of(ElementKind.RESISTANCE, shuntOhm(i));
        parts.add(part(parts.size(), node, ground, resistor));
      }
    }
    Node end = all.get(nodes);
    OnePort last = OnePort.of(ElementKind.RESISTANCE, END_OHM);
    parts.add(part(parts.size(), end, ground, last));
    OnePort value =
        OnePort.parallel(
            List.of(
                OnePort.of(ElementKind.RESISTANCE, LOAD_OHM),
                OnePort.of(ElementKind.CAPACITANCE, LOAD_FARAD)));
    Load load = new Load("load", Load.Placement.SHUNT, end, ground, value, "", 1);
    Port port = new Port("input", all.get(1), ground, new Port.Closure.Open(), 1);
    return new Network(
        "ladder",
        all,
        parts,
        List.of(),
        List.of(port),
        List.of(load),
        List.of(),
        List.of(),
        Optional.empty());
  }

  private static Part part(int number, Node a, Node b, OnePort value) {
    OptionalDouble rated = OptionalDouble.empty();
    return new Part("p" + number, "impedance", a, b, value, "", rated, 1);
  }
}
