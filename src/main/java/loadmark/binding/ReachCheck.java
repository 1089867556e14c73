package loadmark.binding;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.Severity;
import loadmark.diagnostic.Span;
import loadmark.network.Load;
import loadmark.network.Node;
import loadmark.network.Part;
import loadmark.network.Port;

/** Every port, load and part must hang together with what is judged. */
final class ReachCheck implements Check {
  @Override
  public void check(Draft draft, Findings findings) {
    Connections all = Connections.of(draft, Optional.empty());
    Set<Node> judged = new HashSet<>();
    for (Port port : draft.ports()) {
      for (Node node : new Node[] {port.plus(), port.minus()}) {
        judged.add(node);
        if (!node.isGround() && all.count(node) == 0) {
          report(findings, draft, draft.placeOf(port, node), "port", port.name(), node);
        }
      }
    }
    if (draft.ports().isEmpty()) {
      return;
    }
    Set<Node> free = new HashSet<>();
    for (Set<Node> island : Connections.withPorts(draft).islands()) {
      if (island.stream().noneMatch(judged::contains) && reportFree(island, draft, findings)) {
        free.addAll(island);
      }
    }
    for (Load load : draft.loads()) {
      Connections others = Connections.of(draft, Optional.of(load));
      for (Node node : new Node[] {load.first(), load.second()}) {
        boolean reaches =
            others.reach(node).stream().anyMatch(n -> n.isGround() || judged.contains(n));
        if (!reaches && !free.contains(node)) {
          report(findings, draft, draft.placeOf(load, node), "load", load.name(), node);
        }
      }
    }
  }

  private static void report(
      Findings findings, Draft draft, Span place, String what, String name, Node node) {
    List<String> wired = new ArrayList<>();
    for (Part part : draft.parts()) {
      wired.add(part.first().name());
      wired.add(part.second().name());
    }
    findings.add(
        new Finding(
            Severity.ERROR,
            "no-path",
            place,
            "the node `"
                + node.name()
                + "` of the "
                + what
                + " `"
                + name
                + "` has no path to the rest of the network",
            Optional.of(
                Nearest.find(node.name(), wired)
                    .map(near -> "did you mean " + near + "?")
                    .orElse("no wire leads to it"))));
  }

  /** Reports the parts of an island without a port; false where it has none. */
  private static boolean reportFree(Set<Node> island, Draft draft, Findings findings) {
    List<Part> parts = new ArrayList<>();
    for (Part part : draft.parts()) {
      if (island.contains(part.first())) {
        parts.add(part);
      }
    }
    if (parts.isEmpty()) {
      return false;
    }
    Comparator<Part> byPlace =
        Comparator.<Part>comparingInt(p -> draft.placeOf(p).line())
            .thenComparingInt(p -> draft.placeOf(p).column());
    parts.sort(byPlace);
    StringBuilder names = new StringBuilder();
    for (int i = 0; i < Math.min(parts.size(), 5); i++) {
      names.append(i == 0 ? "" : ", ").append('`').append(parts.get(i).name()).append('`');
    }
    if (parts.size() > 5) {
      names.append(" and ").append(parts.size() - 5).append(" more");
    }
    findings.error(
        "hanging",
        draft.placeOf(parts.get(0)),
        names + (parts.size() == 1 ? " hangs" : " hang") + " free of every port",
        "join them to the network, or leave them out");
    return true;
  }
}
