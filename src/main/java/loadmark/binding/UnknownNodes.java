package loadmark.binding;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.network.Node;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;

/**
 * Finds the nodes of ports and loads to which no wire and no supply leads, nor a series load from
 * elsewhere: most often a slip of the pen.
 */
final class UnknownNodes {
  private final Declarations declared;
  private final Set<String> known = new HashSet<>();
  private final Map<String, Integer> mentions = new HashMap<>();
  private final Set<String> inSeries = new HashSet<>();
  private final List<Name> supplied = new ArrayList<>();
  private boolean anyWire;

  /**
   * @param nodes those that the wires name, and no others yet
   */
  UnknownNodes(List<Statement> statements, Declarations declared, Wiring wiring, Nodes nodes) {
    this.declared = declared;
    for (Node node : nodes.all()) {
      known.add(node.name());
    }
    for (Statement statement : statements) {
      if (statement instanceof Statement.Wire wire) {
        anyWire = true;
        if (wiring.isDoubtful()) {
          // A chain that could not be followed may hold any of its names as a node.
          wire.items().forEach(item -> known.add(item.name().text()));
        }
      } else if (statement instanceof Statement.Supply supply) {
        supplied.add(supply.node());
      } else if (statement instanceof Statement.Port port) {
        count(port.nodes());
      } else if (statement instanceof Statement.Load load) {
        count(load.nodes());
        if (load.placement() == Statement.Placement.SERIES) {
          inSeries.add(load.nodes().plus().text());
          inSeries.add(load.nodes().minus().text());
        }
      }
    }
  }

  private void count(Statement.NodePair pair) {
    mentions.merge(pair.plus().text(), 1, Integer::sum);
    mentions.merge(pair.minus().text(), 1, Integer::sum);
  }

  void report(Findings findings) {
    if (!anyWire) {
      return;
    }
    for (Name node : supplied) {
      report(findings, "the supply", node);
    }
    for (Statement.Port port : declared.ports().values()) {
      report(findings, "port", port.name(), port.nodes());
    }
    for (Statement.Load load : declared.loads().values()) {
      report(findings, "load", load.name(), load.nodes());
    }
  }

  private void report(Findings findings, String what, Name owner, Statement.NodePair pair) {
    String whose = "the " + what + " `" + owner.text() + "`";
    report(findings, whose, pair.plus());
    report(findings, whose, pair.minus());
  }

  private void report(Findings findings, String whose, Name node) {
    Optional<String> near = Nearest.find(node.text(), known);
    // A wire that could not be read may lead there; only a likely misspelling is then worth a word.
    boolean excused = declared.isBroken("wire") && near.isEmpty();
    if (!isKnown(node.text()) && !excused) {
      findings.error(
          "no-path",
          node.span(),
          "the node `" + node.text() + "` of " + whose + " has no path to the rest of the network",
          near.map(word -> "did you mean `" + word + "`?")
              .orElse(
                  declared.parts().containsKey(node.text())
                      ? "`" + node.text() + "` is a part; name one of its nodes"
                      : "no wire leads to it"));
    }
  }

  private boolean isKnown(String node) {
    boolean betweenLoads = inSeries.contains(node) && mentions.getOrDefault(node, 0) > 1;
    return known.contains(node) || betweenLoads || declared.isDoubtful(node);
  }
}
