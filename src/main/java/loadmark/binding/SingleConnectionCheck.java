package loadmark.binding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.Severity;
import loadmark.network.Node;
import loadmark.network.Part;

/** A node where only one thing ends carries no current: most often a slip of the pen. */
final class SingleConnectionCheck implements Check {
  @Override
  public void check(Draft draft, Findings findings) {
    Connections all = Connections.withPorts(draft);
    Set<Node> free = ReachCheck.findFree(draft);
    for (Node node : draft.nodes().all()) {
      Optional<Part> only = all.findOnly(node).flatMap(Connections.Edge::part);
      if (node.isGround() || only.isEmpty() || free.contains(node)) {
        continue;
      }
      List<String> others = new ArrayList<>();
      for (Node other : draft.nodes().all()) {
        if (!other.equals(node)) {
          others.add(other.name());
        }
      }
      findings.add(
          new Finding(
              Severity.WARNING,
              "single-connection",
              draft.nodes().place(node),
              "the node `"
                  + node.name()
                  + "` has a single connection: `"
                  + only.get().name()
                  + "` has no effect",
              Nearest.find(node.name(), others).map(near -> "did you mean `" + near + "`?")));
    }
  }
}
