package loadmark.equation;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;

/** Takes a network with a set of loads apart into a {@link Circuit}. */
public final class CircuitBuilder {
  private final List<Integer> joined = new ArrayList<>();
  private final List<CircuitBranch> sources = new ArrayList<>();
  private final List<CircuitBranch> elements = new ArrayList<>();

  private CircuitBuilder(int nodes) {
    for (int i = 0; i < nodes; i++) {
      newNode();
    }
  }

  /**
   * The network seen at a port: what closes the port is off, every other port is closed.
   *
   * @param on the loads that are on
   * @param places loads whose places are to be driven or measured, in the order of the circuit's
   *     sources after the port. A shunt load that is on gets a {@code SHORT} in series, one that is
   *     off an {@code OPEN} at its place; a series load that is on an {@code OPEN} across it, one
   *     that is off a {@code SHORT} at its place. Each runs from the load's first node to its
   *     second
   */
  public static Circuit build(Network network, Port port, Collection<Load> on, List<Load> places) {
    CircuitBuilder builder = new CircuitBuilder(network.nodes().size());
    builder.sources.add(open(port.plus().index(), port.minus().index()));
    for (Part part : network.parts()) {
      builder.add(part.first(), part.second(), part.value());
    }
    for (Supply supply : network.supplies()) {
      Node ground = network.nodes().get(0);
      supply
          .behind()
          .ifPresentOrElse(
              behind -> builder.add(supply.node(), ground, behind),
              () -> builder.join(supply.node().index(), ground.index()));
    }
    network.ports().stream().filter(p -> !p.equals(port)).forEach(builder::close);
    Map<Load, CircuitBranch> placed = builder.addLoads(network, on, places);
    places.forEach(load -> builder.sources.add(placed.get(load)));
    return builder.circuit();
  }

  /** A two-terminal alone, seen from its ends. */
  public static Circuit build(OnePort alone) {
    CircuitBuilder builder = new CircuitBuilder(2);
    builder.sources.add(open(0, 1));
    builder.add(0, 1, alone);
    return builder.circuit();
  }

  private void close(Port port) {
    if (port.closure() instanceof Port.Closure.Terminated terminated) {
      add(port.plus(), port.minus(), terminated.value());
    } else if (port.closure() instanceof Port.Closure.Driven driven) {
      add(port.plus(), port.minus(), driven.behind());
    } else if (port.closure() instanceof Port.Closure.Shorted) {
      join(port.plus().index(), port.minus().index());
    }
  }

  private Map<Load, CircuitBranch> addLoads(
      Network network, Collection<Load> on, List<Load> places) {
    Map<Load, CircuitBranch> placed = new LinkedHashMap<>();
    Map<Set<Node>, List<Load>> series = new LinkedHashMap<>();
    for (Load load : network.loads()) {
      int first = load.first().index();
      int second = load.second().index();
      if (load.placement() == Load.Placement.SERIES) {
        series
            .computeIfAbsent(Set.of(load.first(), load.second()), s -> new ArrayList<>())
            .add(load);
      } else if (on.contains(load)) {
        int inner = places.contains(load) ? newNode() : first;
        placed.put(load, new CircuitBranch(CircuitBranch.Kind.SHORT, first, inner, 0));
        add(inner, second, load.value());
      } else {
        placed.put(load, open(first, second));
      }
    }
    series.values().forEach(chain -> addSeries(chain, on, places, placed));
    return placed;
  }

  /** The series loads of one place, end to end from the first one's first node to its second. */
  private void addSeries(
      List<Load> chain, Collection<Load> on, List<Load> places, Map<Load, CircuitBranch> placed) {
    Node start = chain.get(0).first();
    int from = start.index();
    for (int i = 0; i < chain.size(); i++) {
      Load load = chain.get(i);
      int to = i < chain.size() - 1 ? newNode() : chain.get(0).second().index();
      int first = load.first().equals(start) ? from : to;
      int second = first == from ? to : from;
      if (on.contains(load)) {
        add(first, second, load.value());
        placed.put(load, open(first, second));
      } else if (places.contains(load)) {
        placed.put(load, new CircuitBranch(CircuitBranch.Kind.SHORT, first, second, 0));
      } else {
        join(first, second);
      }
      from = to;
    }
  }

  private void add(Node first, Node second, OnePort value) {
    add(first.index(), second.index(), value);
  }

  private void add(int first, int second, OnePort value) {
    if (value instanceof OnePort.Element element) {
      add(first, second, element);
    } else if (value instanceof OnePort.Parallel parallel) {
      parallel.members().forEach(member -> add(first, second, member));
    } else if (value instanceof OnePort.Series series) {
      int from = first;
      int last = series.members().size() - 1;
      for (int i = 0; i <= last; i++) {
        int to = i < last ? newNode() : second;
        add(from, to, series.members().get(i));
        from = to;
      }
    }
  }

  private void add(int first, int second, OnePort.Element element) {
    double value = element.value().nominal();
    switch (element.kind()) {
      case RESISTANCE -> {
        if (value == 0) {
          join(first, second);
        } else {
          elements.add(new CircuitBranch(CircuitBranch.Kind.RESISTOR, first, second, value));
        }
      }
      case CONDUCTANCE -> {
        if (value > 0) {
          elements.add(new CircuitBranch(CircuitBranch.Kind.RESISTOR, first, second, 1 / value));
        }
      }
      case CAPACITANCE ->
          elements.add(new CircuitBranch(CircuitBranch.Kind.CAPACITOR, first, second, value));
      case INDUCTANCE ->
          elements.add(new CircuitBranch(CircuitBranch.Kind.INDUCTOR, first, second, value));
    }
  }

  private static CircuitBranch open(int from, int to) {
    return new CircuitBranch(CircuitBranch.Kind.OPEN, from, to, 0);
  }

  private int newNode() {
    joined.add(joined.size());
    return joined.size() - 1;
  }

  private int root(int node) {
    int root = node;
    while (joined.get(root) != root) {
      root = joined.get(root);
    }
    return root;
  }

  private void join(int a, int b) {
    joined.set(root(a), root(b));
  }

  /** Links resolved; elements whose ends are joined are left out, since no current leaves them. */
  private Circuit circuit() {
    List<CircuitBranch> kept = new ArrayList<>();
    for (CircuitBranch element : elements) {
      CircuitBranch moved = moved(element);
      if (moved.from() != moved.to()) {
        kept.add(moved);
      }
    }
    return new Circuit(joined.size(), sources.stream().map(this::moved).toList(), kept);
  }

  private CircuitBranch moved(CircuitBranch branch) {
    return new CircuitBranch(branch.kind(), root(branch.from()), root(branch.to()), branch.value());
  }
}
