package loadmark.allowance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.Port;

/** Networks that differ from a given one at the place of a load. */
final class PlaceNetwork {
  private final Network network;
  private final Load load;

  PlaceNetwork(Network network, Load load) {
    this.network = network;
    this.load = load;
  }

  /** The load with another value. */
  Load with(OnePort value) {
    return new Load(
        load.name(),
        load.placement(),
        load.first(),
        load.second(),
        value,
        load.text(),
        load.line());
  }

  /** The network with {@code changed} in place of the load, judged for one case by some limits. */
  Network with(Load changed, Case one, List<Limit> limits) {
    return of(
        network.nodes(),
        network.ports(),
        replaced(network.loads(), Optional.of(changed)),
        List.of(one),
        limits);
  }

  /** A list of loads with {@code other} in place of the load, or without it. */
  List<Load> replaced(List<Load> loads, Optional<Load> other) {
    List<Load> others = new ArrayList<>();
    for (Load one : loads) {
      if (!one.equals(load)) {
        others.add(one);
      } else {
        other.ifPresent(others::add);
      }
    }
    return others;
  }

  /** A network and the port of it that looks into the load's place. */
  record Seen(Network network, Port place) {}

  /**
   * A port in place of the load. Other series loads between the same nodes are in series with it,
   * so they get a node between.
   *
   * @param open the port that is open meanwhile
   */
  Seen seen(Port open) {
    List<Node> nodes = new ArrayList<>(network.nodes());
    boolean shared =
        load.placement() == Load.Placement.SERIES
            && network.loads().stream().anyMatch(o -> !o.equals(load) && isBeside(o));
    Node near = load.first();
    List<Load> loads = replaced(network.loads(), Optional.empty());
    if (shared) {
      near = new Node(nodes.size(), fresh(nodes.stream().map(Node::name).toList()));
      nodes.add(near);
      Node between = near;
      loads.replaceAll(o -> isBeside(o) ? moved(o, between) : o);
    }
    Port place =
        new Port(
            fresh(network.ports().stream().map(Port::name).toList()),
            near,
            load.second(),
            new Port.Closure.Open(),
            load.line());
    List<Port> ports = new ArrayList<>(network.ports());
    ports.replaceAll(
        p ->
            p.equals(open)
                ? new Port(p.name(), p.plus(), p.minus(), new Port.Closure.Open(), p.line())
                : p);
    ports.add(place);
    return new Seen(of(nodes, ports, loads, List.of(), List.of()), place);
  }

  /** The loads of {@link #seen} that stand for some of the network. */
  static List<Load> same(List<Load> loads, Network seen) {
    List<String> names = loads.stream().map(Load::name).toList();
    return seen.loads().stream().filter(l -> names.contains(l.name())).toList();
  }

  private boolean isBeside(Load other) {
    return other.placement() == Load.Placement.SERIES
        && (isAt(other, load.first(), load.second()) || isAt(other, load.second(), load.first()));
  }

  private static boolean isAt(Load load, Node a, Node b) {
    return load.first().equals(a) && load.second().equals(b);
  }

  /** From the load's first node to the node between. */
  private Load moved(Load other, Node between) {
    return new Load(
        other.name(),
        other.placement(),
        load.first(),
        between,
        other.value(),
        other.text(),
        other.line());
  }

  /** Longer than all names there are, so none of them. */
  private static String fresh(List<String> names) {
    return names.stream().collect(Collectors.joining()) + "'";
  }

  private Network of(
      List<Node> nodes, List<Port> ports, List<Load> loads, List<Case> cases, List<Limit> limits) {
    return new Network(
        network.title(),
        nodes,
        network.parts(),
        network.supplies(),
        ports,
        loads,
        cases,
        limits,
        network.sweep());
  }
}
