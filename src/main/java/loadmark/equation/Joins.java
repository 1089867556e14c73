package loadmark.equation;

/** Which nodes are one: disjoint sets with path halving. */
final class Joins {
  private final int[] parent;

  Joins(int nodes) {
    parent = new int[nodes];
    for (int i = 0; i < nodes; i++) {
      parent[i] = i;
    }
  }

  /** The node that stands for this one. */
  int of(int node) {
    int at = node;
    while (parent[at] != at) {
      parent[at] = parent[parent[at]];
      at = parent[at];
    }
    return at;
  }

  void join(int a, int b) {
    int first = of(a);
    int second = of(b);
    parent[Math.max(first, second)] = Math.min(first, second);
  }

  boolean areOne(int a, int b) {
    return of(a) == of(b);
  }
}
