package loadmark.binding;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.Span;
import loadmark.network.Node;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;
import loadmark.syntax.Statement.WireItem;

/**
 * Reads the wires: which nodes each part stands between. In a chain node and part take turns; where
 * they don't, the likely slip is reported once and the chain is read on as it was most likely
 * meant.
 */
final class Wiring {
  /** Where a part stands. */
  record Place(Node first, Node second, Span span) {}

  private final Declarations declared;
  private final Nodes nodes;
  private final Findings findings;
  private final Map<String, Place> places = new LinkedHashMap<>();
  private final Map<String, Integer> mentions = new HashMap<>();
  private final Set<String> excused = new HashSet<>();
  private boolean doubtful;

  Wiring(Declarations declared, Nodes nodes, Findings findings) {
    this.declared = declared;
    this.nodes = nodes;
    this.findings = findings;
  }

  void read(List<Statement> statements) {
    List<Statement.Wire> wires = new ArrayList<>();
    for (Statement statement : statements) {
      if (statement instanceof Statement.Wire wire) {
        wires.add(wire);
        for (WireItem item : wire.items()) {
          mentions.merge(item.name().text(), 1, Integer::sum);
        }
      }
    }
    for (Statement.Wire wire : wires) {
      readChain(wire.items());
    }
    reportUnwired();
  }

  /** Where each wired part stands, by name. */
  Map<String, Place> places() {
    return places;
  }

  /**
   * Whether some wire could not be followed, so that nothing can be said of what hangs together.
   */
  boolean isDoubtful() {
    return doubtful;
  }

  private void readChain(List<WireItem> items) {
    WireItem head = items.get(0);
    if (items.size() == 1) {
      findings.error(
          "wire-end", head.span(), "this wire joins nothing", "write node -- part -- node");
      doubtful = true;
      return;
    }
    if (isPart(head) && !isPart(items.get(1)) && alternates(items, 1)) {
      reportEnd(head, "begins");
      return;
    }
    warnOfSharedNames(items);
    Node before = nodes.mention(head.name());
    int i = 1;
    while (i < items.size()) {
      WireItem item = items.get(i);
      boolean last = i == items.size() - 1;
      if (last && isPart(item)) {
        reportEnd(item, "ends");
        return;
      }
      if (!isPart(item) && (last || (isPart(items.get(i + 1)) && !isLikelyPart(item)))) {
        if (i > 1 && isPart(items.get(i - 1))) {
          reportPartsSideBySide(items.get(i - 2), items.get(i - 1));
        } else {
          reportSideBySide(items.get(i - 1), item);
        }
        before = nodes.mention(item.name());
        i++;
        continue;
      }
      WireItem behind = items.get(i + 1);
      if (isForgottenNode(items, i)) {
        reportPartsSideBySide(item, behind);
        excuseRest(items, i);
        return;
      }
      Node after = nodes.mention(behind.name());
      place(item, before, after);
      before = after;
      i += 2;
    }
  }

  private boolean isPart(WireItem item) {
    return declared.isPart(item.name().text());
  }

  /** Whether a name that is no part is a misspelt one, rather than a node. */
  private boolean isLikelyPart(WireItem item) {
    return declared.isDoubtful(item.name().text()) || findUnwiredNear(item.name()).isPresent();
  }

  private Optional<String> findUnwiredNear(Name name) {
    Set<String> unwired = new LinkedHashSet<>(declared.parts().keySet());
    unwired.removeAll(mentions.keySet());
    unwired.removeAll(places.keySet());
    return Nearest.find(name.text(), unwired);
  }

  /** The only part that no wire names, where there is one: most likely the one that is meant. */
  private Optional<String> findOnlyUnwired() {
    Set<String> unwired = new LinkedHashSet<>(declared.parts().keySet());
    unwired.removeAll(mentions.keySet());
    return unwired.size() == 1
        ? unwired.stream().filter(name -> !places.containsKey(name)).findFirst()
        : Optional.empty();
  }

  /** Whether node and part take turns from here, beginning with a node. */
  private boolean alternates(List<WireItem> items, int from) {
    for (int i = from + 1; i < items.size(); i += 2) {
      if (!isPart(items.get(i))) {
        return false;
      }
    }
    return true;
  }

  /** A part's name in a node's place, where that part stands nowhere else: a node was left out. */
  private boolean isForgottenNode(List<WireItem> items, int part) {
    WireItem behind = items.get(part + 1);
    return isPart(items.get(part))
        && isPart(behind)
        && !behind.name().quoted()
        && mentions.getOrDefault(behind.name().text(), 0) == 1;
  }

  private void place(WireItem item, Node before, Node after) {
    String name = item.name().text();
    if (item.port().isPresent()) {
      findings.error(
          "undeclared-part",
          item.span(),
          "`" + name + "` has no port `" + item.port().get().text() + "`",
          "a part with two terminals is wired by its name alone");
      doubtful = true;
      excused.add(name);
      return;
    }
    if (isPart(item) && !declared.parts().containsKey(name)) {
      doubtful = true;
      return;
    }
    if (!isPart(item)) {
      Optional<String> near = reportUndeclared(item);
      if (near.isEmpty()) {
        return;
      }
      name = near.get();
    }
    if (before.equals(after)) {
      findings.error(
          "same-node",
          item.span(),
          "both ends of `" + name + "` are on the node `" + before.name() + "`",
          "a part stands between two different nodes");
    }
    Place earlier = places.putIfAbsent(name, new Place(before, after, item.span()));
    if (earlier != null && declared.isDoubtful(name)) {
      doubtful = true;
    } else if (earlier != null) {
      findings.error(
          "wired-twice",
          item.span(),
          "`" + name + "` is wired already, on line " + earlier.span().line(),
          "every part is wired exactly once");
      doubtful = true;
    }
  }

  /** Reports a name that is no part; the part that was most likely meant, if any. */
  private Optional<String> reportUndeclared(WireItem item) {
    String name = item.name().text();
    if (declared.isDoubtful(name) || declared.hasNamelessPart()) {
      doubtful = true;
      return Optional.empty();
    }
    if (declared.loads().containsKey(name)) {
      findings.error(
          "undeclared-part",
          item.span(),
          "`" + name + "` is a load; loads are not wired",
          "the load's own line says where it hangs");
      doubtful = true;
      return Optional.empty();
    }
    Optional<String> near = findUnwiredNear(item.name()).or(this::findOnlyUnwired);
    if (near.isPresent()) {
      findings.error(
          "undeclared-part",
          item.span(),
          "there is no part `" + name + "`",
          "did you mean `" + near.get() + "`?");
      return near;
    }
    findings.error(
        "undeclared-part",
        item.span(),
        "there is no part `" + name + "`",
        Nearest.find(name, declared.parts().keySet())
            .map(other -> "did you mean `" + other + "`?")
            .orElse("declare it on a line of its own, for example: resistor " + name + " = 10 kΩ"));
    doubtful = true;
    return Optional.empty();
  }

  private void reportEnd(WireItem part, String how) {
    findings.error(
        "wire-end",
        part.span(),
        "this wire " + how + " with the part `" + part.name().text() + "`",
        "a wire begins and ends with a node");
    doubtful = true;
    excused.add(part.name().text());
  }

  private void reportSideBySide(WireItem first, WireItem second) {
    findings.error(
        "nodes-side-by-side",
        second.span(),
        "`"
            + first.name().text()
            + "` and `"
            + second.name().text()
            + "` stand side by side, and neither is a part",
        "nodes and parts take turns; to join two nodes use one name, or a resistor of 0 Ω");
    doubtful = true;
  }

  private void reportPartsSideBySide(WireItem first, WireItem second) {
    String one = first.name().text();
    String other = second.name().text();
    findings.error(
        "parts-side-by-side",
        second.span(),
        "the parts `" + one + "` and `" + other + "` stand side by side",
        "name the node between them: … -- " + one + " -- NODE -- " + other + " -- …");
    doubtful = true;
  }

  private void excuseRest(List<WireItem> items, int from) {
    for (WireItem item : items.subList(from, items.size())) {
      excused.add(item.name().text());
    }
  }

  private void warnOfSharedNames(List<WireItem> items) {
    Set<String> partsHere = new HashSet<>();
    for (int i = 1; i < items.size(); i += 2) {
      partsHere.add(items.get(i).name().text());
    }
    for (int i = 0; i < items.size(); i += 2) {
      Name node = items.get(i).name();
      boolean forgotten = i > 1 && isForgottenNode(items, i - 1);
      if (partsHere.contains(node.text()) && isPart(items.get(i)) && !forgotten) {
        findings.warning(
            "node-and-part",
            node.span(),
            "`" + node.text() + "` is a node and a part of this chain",
            "give one of them another name");
      }
    }
  }

  private void reportUnwired() {
    for (Statement.Part part : declared.parts().values()) {
      String name = part.name().text();
      boolean excusedHere =
          declared.isBroken("wire") || excused.contains(name) || declared.isDoubtful(name);
      if (!places.containsKey(name) && !excusedHere) {
        findings.error(
            "unwired",
            part.name().span(),
            "`" + name + "` is not wired",
            "put it between two nodes: wire … -- " + name + " -- …");
        doubtful = true;
      }
    }
  }
}
