package loadmark.binding;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.network.Load;
import loadmark.network.Node;
import loadmark.network.Part;
import loadmark.network.Port;

/** Every part and load must hang together with what is judged. */
final class ReachCheck implements Check {
  private static final int MOST_NAMES = 5;

  @Override
  public void check(Draft draft, Findings findings) {
    Set<Node> judged = judged(draft);
    Set<Node> free = new HashSet<>();
    for (Set<Node> island : findFreeIslands(draft)) {
      if (reportFree(island, draft, findings)) {
        free.addAll(island);
      }
    }
    if (judged.isEmpty()) {
      return;
    }
    Connections all = Connections.of(draft, Optional.empty());
    for (Port port : draft.ports()) {
      boolean apart = !all.reach(port.plus()).contains(port.minus());
      if (apart && all.count(port.plus()) > 0 && all.count(port.minus()) > 0) {
        findings.error(
            "no-path",
            draft.lineOf(port).nodes().span(),
            "nothing leads from `"
                + port.plus().name()
                + "` to `"
                + port.minus().name()
                + "`: the port `"
                + port.name()
                + "` is open, whatever hangs on it",
            "one of the two is another node, or a wire is missing");
      }
    }
    for (Load load : draft.loads()) {
      Connections others = Connections.of(draft, Optional.of(load));
      for (Node node : new Node[] {load.first(), load.second()}) {
        boolean reaches =
            others.reach(node).stream().anyMatch(n -> n.isGround() || judged.contains(n));
        if (!reaches && !free.contains(node) && others.count(node) > 0) {
          findings.error(
              "no-path",
              draft.placeOf(load, node),
              "the node `"
                  + node.name()
                  + "` of the load `"
                  + load.name()
                  + "` has no path to the rest of the network",
              "join what hangs there to the network");
        }
      }
    }
  }

  /** The nodes that hang together with no port; none where the file has no port. */
  static Set<Node> findFree(Draft draft) {
    Set<Node> free = new HashSet<>();
    findFreeIslands(draft).forEach(free::addAll);
    return free;
  }

  private static List<Set<Node>> findFreeIslands(Draft draft) {
    Set<Node> judged = judged(draft);
    List<Set<Node>> free = new ArrayList<>();
    if (!judged.isEmpty()) {
      for (Set<Node> island : Connections.withPorts(draft).islands()) {
        if (island.stream().noneMatch(judged::contains)) {
          free.add(island);
        }
      }
    }
    return free;
  }

  private static Set<Node> judged(Draft draft) {
    Set<Node> judged = new HashSet<>();
    for (Port port : draft.ports()) {
      judged.add(port.plus());
      judged.add(port.minus());
    }
    return judged;
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
    for (int i = 0; i < Math.min(parts.size(), MOST_NAMES); i++) {
      names.append(i == 0 ? "" : ", ").append('`').append(parts.get(i).name()).append('`');
    }
    if (parts.size() > MOST_NAMES) {
      names.append(" and ").append(parts.size() - MOST_NAMES).append(" more");
    }
    findings.error(
        "hanging",
        draft.placeOf(parts.get(0)),
        names + (parts.size() == 1 ? " hangs" : " hang") + " free of every port",
        "join what hangs free to the network, or leave it out");
    return true;
  }
}
