package loadmark.binding;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import loadmark.diagnostic.Span;
import loadmark.network.Node;
import loadmark.syntax.Name;

/**
 * The nodes met so far, in the order met, ground first; each with the place of its first mention.
 */
final class Nodes {
  private final Map<String, Node> byName = new LinkedHashMap<>();
  private final List<Optional<Span>> firstMention = new ArrayList<>();

  Nodes() {
    byName.put(Declarations.GROUND, new Node(0, Declarations.GROUND));
    firstMention.add(Optional.empty());
  }

  Node mention(Name name) {
    Node known = byName.get(name.text());
    if (known != null) {
      return known;
    }
    Node node = new Node(byName.size(), name.text());
    byName.put(name.text(), node);
    firstMention.add(Optional.of(name.span()));
    return node;
  }

  Node ground() {
    return Objects.requireNonNull(byName.get(Declarations.GROUND));
  }

  Optional<Node> find(String name) {
    return Optional.ofNullable(byName.get(name));
  }

  List<Node> all() {
    return List.copyOf(byName.values());
  }

  /** Where a node is first named; every node but ground has such a place. */
  Span place(Node node) {
    return firstMention.get(node.index()).orElseThrow();
  }
}
