package loadmark.binding;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.network.Load;
import loadmark.network.Node;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;
import org.jgrapht.Graph;
import org.jgrapht.alg.connectivity.ConnectivityInspector;
import org.jgrapht.graph.Pseudograph;

/** What hangs on what: a graph of the nodes, with an edge for each thing between two of them. */
final class Connections {
  /** One thing between two nodes. Identity tells edges apart. */
  static final class Edge {
    private final Optional<Part> part;

    private Edge(Optional<Part> part) {
      this.part = part;
    }

    Optional<Part> part() {
      return part;
    }
  }

  private final Graph<Node, Edge> graph = new Pseudograph<>(Edge.class);

  private Connections() {}

  /** Parts, supplies and every load but {@code except}; ports are not connections. */
  static Connections of(Draft draft, Optional<Load> except) {
    Connections all = new Connections();
    for (Node node : draft.nodes().all()) {
      all.graph.addVertex(node);
    }
    for (Part part : draft.parts()) {
      all.graph.addEdge(part.first(), part.second(), new Edge(Optional.of(part)));
    }
    for (Supply supply : draft.supplies()) {
      all.graph.addEdge(supply.node(), draft.nodes().ground(), new Edge(Optional.empty()));
    }
    for (Load load : draft.loads()) {
      if (except.isEmpty() || !except.get().equals(load)) {
        all.graph.addEdge(load.first(), load.second(), new Edge(Optional.empty()));
      }
    }
    return all;
  }

  /** Those, and every port with what closes it. */
  static Connections withPorts(Draft draft) {
    Connections all = of(draft, Optional.empty());
    for (Port port : draft.ports()) {
      all.graph.addEdge(port.plus(), port.minus(), new Edge(Optional.empty()));
    }
    return all;
  }

  int count(Node node) {
    return graph.degreeOf(node);
  }

  /** The only edge at a node, where there is one. */
  Optional<Edge> findOnly(Node node) {
    Set<Edge> edges = graph.edgesOf(node);
    return graph.degreeOf(node) == 1 ? Optional.of(edges.iterator().next()) : Optional.empty();
  }

  /** The sets of nodes that hang together. */
  List<Set<Node>> islands() {
    return new ConnectivityInspector<>(graph).connectedSets();
  }

  /** Everything that a node hangs together with, itself included. */
  Set<Node> reach(Node node) {
    return new ConnectivityInspector<>(graph).connectedSetOf(node);
  }
}
