package loadmark.binding;

import java.util.HashSet;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.network.Load;
import loadmark.network.Load.Placement;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;
import org.jgrapht.alg.util.UnionFind;

/** A port's two nodes must be two: not one name, nor joined by what has no impedance. */
final class PortNodesCheck implements Check {
  @Override
  public void check(Draft draft, Findings findings) {
    Set<Port> told = new HashSet<>();
    for (Port port : draft.ports()) {
      if (port.plus().equals(port.minus())) {
        report(findings, draft, port, "both nodes of the port are `" + port.plus().name() + "`");
        continue;
      }
      UnionFind<Node> joined = new UnionFind<>(new HashSet<>(draft.nodes().all()));
      for (Part part : draft.parts()) {
        if (OnePort.isLink(part.value()) && joins(joined, port, part.first(), part.second())) {
          report(findings, draft, port, "the link `" + part.name() + "` joins the port's nodes");
        }
      }
      for (Supply supply : draft.supplies()) {
        if (supply.behind().isEmpty()
            && joins(joined, port, supply.node(), draft.nodes().ground())) {
          report(
              findings,
              draft,
              port,
              "the supply of `" + supply.node().name() + "` joins the port's nodes");
        }
      }
      for (Load load : draft.loads()) {
        if (load.placement() == Placement.SERIES
            && joins(joined, port, load.first(), load.second())) {
          report(
              findings,
              draft,
              port,
              "while the series load `" + load.name() + "` is absent, the port's nodes are one");
        }
      }
      for (Port other : draft.ports()) {
        if (!other.equals(port)
            && other.closure() instanceof Port.Closure.Shorted
            && joins(joined, port, other.plus(), other.minus())
            && told.add(other)) {
          report(
              findings,
              draft,
              port,
              "the port `"
                  + other.name()
                  + "` is driven behind nothing, which joins this port's nodes");
        }
      }
    }
  }

  /** Joins two nodes; true where that is what made the port's nodes one. */
  private static boolean joins(UnionFind<Node> joined, Port port, Node a, Node b) {
    boolean before = joined.inSameSet(port.plus(), port.minus());
    joined.union(a, b);
    return !before && joined.inSameSet(port.plus(), port.minus());
  }

  private static void report(Findings findings, Draft draft, Port port, String what) {
    findings.error(
        "port-shorted",
        draft.lineOf(port).nodes().span(),
        what,
        "an impedance is judged between two different nodes");
  }
}
