package loadmark.binding;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;

/**
 * Finds the nodes that a port or a load names and nothing else does: most often a slip of the pen.
 */
final class UnknownNodes {
  private final Declarations declared;
  private final Map<String, Integer> mentions = new HashMap<>();
  private final Set<String> wired = new HashSet<>();

  UnknownNodes(List<Statement> statements, Declarations declared) {
    this.declared = declared;
    for (Statement statement : statements) {
      if (statement instanceof Statement.Wire wire) {
        // Part or node: where a chain is off its turn, either may stand anywhere in it.
        for (Statement.WireItem item : wire.items()) {
          count(item.name());
          wired.add(item.name().text());
        }
      } else if (statement instanceof Statement.Supply supply) {
        count(supply.node());
        wired.add(supply.node().text());
      } else if (statement instanceof Statement.Port port) {
        count(port.nodes().plus());
        count(port.nodes().minus());
      } else if (statement instanceof Statement.Load load) {
        count(load.nodes().plus());
        count(load.nodes().minus());
      }
    }
    wired.removeAll(declared.parts().keySet());
  }

  private void count(Name node) {
    mentions.merge(node.text(), 1, Integer::sum);
  }

  void report(Findings findings) {
    for (Statement.Port port : declared.ports().values()) {
      report(findings, "port", port.name(), port.nodes());
    }
    for (Statement.Load load : declared.loads().values()) {
      report(findings, "load", load.name(), load.nodes());
    }
  }

  private void report(Findings findings, String what, Name owner, Statement.NodePair pair) {
    for (Name node : List.of(pair.plus(), pair.minus())) {
      if (mentions.getOrDefault(node.text(), 0) == 1
          && !node.text().equals(Declarations.GROUND)
          && !declared.isDoubtful(node.text())) {
        findings.error(
            "no-path",
            node.span(),
            "the node `"
                + node.text()
                + "` of the "
                + what
                + " `"
                + owner.text()
                + "` has no path to the rest of the network",
            Nearest.find(node.text(), wired)
                .map(near -> "did you mean `" + near + "`?")
                .orElse("no wire leads to it"));
      }
    }
  }
}
