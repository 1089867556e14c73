package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Part;
import loadmark.network.Port;

/** Seeded ladders and bridged networks, values over six decades, with one to three loads. */
final class RandomNetworks {
  private static final double LEAST_OHM = 1;
  private static final double LEAST_HENRY = 1e-8;
  private static final double LEAST_FARAD = 1e-13;
  private static final double DECADES = 6;

  private final Random random;
  private final List<Node> nodes = new ArrayList<>();
  private final List<Part> parts = new ArrayList<>();

  private RandomNetworks(long seed) {
    random = new Random(seed);
    nodes.add(new Node(0, "ground"));
  }

  /** A network of {@code reactive} reactive elements; its port goes from node 1 to ground. */
  static Network of(long seed, int reactive) {
    RandomNetworks maker = new RandomNetworks(seed);
    return maker.make(reactive);
  }

  private Network make(int reactive) {
    Node at = newNode();
    int left = reactive;
    while (left > 0) {
      Node next = newNode();
      left -= arm(at, next, left, false);
      left -= arm(next, nodes.get(0), left, true);
      at = next;
    }
    part(at, nodes.get(0), element(ElementKind.RESISTANCE));
    if (random.nextBoolean()) {
      int bridges = 1 + random.nextInt(3);
      for (int i = 0; i < bridges; i++) {
        part(any(), any(), element(ElementKind.RESISTANCE));
      }
    }
    List<Load> loads = new ArrayList<>();
    int count = 1 + random.nextInt(3);
    for (int i = 0; i < count; i++) {
      loads.add(load(i));
    }
    Port port = new Port("input", nodes.get(1), nodes.get(0), new Port.Closure.Open(), 1);
    return new Network(
        "", nodes, parts, List.of(), List.of(port), loads, List.of(), List.of(), Optional.empty());
  }

  /** One arm of the ladder; gives how many reactive elements it has. */
  private int arm(Node a, Node b, int most, boolean shunt) {
    int kind = random.nextInt(most > 1 ? 6 : most > 0 ? 5 : 1);
    ElementKind reactive =
        shunt == random.nextInt(4) > 0 ? ElementKind.CAPACITANCE : ElementKind.INDUCTANCE;
    OnePort resistor = element(ElementKind.RESISTANCE);
    OnePort first = element(reactive);
    switch (kind) {
      case 0 -> part(a, b, resistor);
      case 1, 2 -> part(a, b, first);
      case 3 -> part(a, b, OnePort.series(List.of(resistor, first)));
      case 4 -> part(a, b, OnePort.parallel(List.of(resistor, first)));
      default -> {
        OnePort tank =
            OnePort.parallel(
                List.of(element(ElementKind.CAPACITANCE), element(ElementKind.INDUCTANCE)));
        part(a, b, OnePort.series(List.of(resistor, tank)));
      }
    }
    return kind == 0 ? 0 : kind == 5 ? 2 : 1;
  }

  private Load load(int index) {
    OnePort value =
        random.nextBoolean()
            ? OnePort.parallel(
                List.of(element(ElementKind.RESISTANCE), element(ElementKind.CAPACITANCE)))
            : OnePort.series(
                List.of(element(ElementKind.RESISTANCE), element(ElementKind.INDUCTANCE)));
    boolean series = random.nextInt(3) == 0;
    Node a = any();
    Node b = nodes.get(0);
    if (series) {
      Part cut = parts.get(random.nextInt(parts.size()));
      Node middle = newNode();
      parts.remove(cut);
      parts.add(moved(cut, middle));
      a = cut.first();
      b = middle;
    }
    Load.Placement placement = series ? Load.Placement.SERIES : Load.Placement.SHUNT;
    return new Load("load" + index, placement, a, b, value, "", index + 1);
  }

  private static Part moved(Part part, Node first) {
    return new Part(
        part.name(), part.kind(), first, part.second(), part.value(), "", part.rated(), 1);
  }

  private Node newNode() {
    Node node = new Node(nodes.size(), "n" + nodes.size());
    nodes.add(node);
    return node;
  }

  private Node any() {
    return nodes.get(1 + random.nextInt(nodes.size() - 1));
  }

  private OnePort element(ElementKind kind) {
    double factor = Math.pow(10, DECADES * random.nextDouble());
    return OnePort.of(
        kind,
        switch (kind) {
          case RESISTANCE -> LEAST_OHM * factor;
          case CONDUCTANCE -> factor / 1e6;
          case CAPACITANCE -> LEAST_FARAD * factor;
          case INDUCTANCE -> LEAST_HENRY * factor;
        });
  }

  private void part(Node a, Node b, OnePort value) {
    parts.add(
        new Part("p" + parts.size(), "impedance", a, b, value, "", OptionalDouble.empty(), 1));
  }
}
