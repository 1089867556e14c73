package loadmark.equation;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;

/** A growing spanning forest, and the ways in it from node to node. */
final class Forest {
  private final int[] joined;
  private final List<List<Edge>> edges = new ArrayList<>();
  private final Edge[] up;
  private final int[] depth;

  /**
   * An edge as seen from one of its ends.
   *
   * @param sign 1 where the branch points from that end to {@code to}, else −1
   */
  private record Edge(int row, int to, int sign) {}

  Forest(int nodes) {
    joined = new int[nodes];
    depth = new int[nodes];
    up = new Edge[nodes];
    for (int i = 0; i < nodes; i++) {
      joined[i] = i;
      edges.add(new ArrayList<>());
    }
  }

  /** Takes the branch in as the given row, unless it closes a loop. */
  boolean join(CircuitBranch branch, int row) {
    int a = find(branch.from());
    int b = find(branch.to());
    if (a == b) {
      return false;
    }
    joined[a] = b;
    edges.get(branch.from()).add(new Edge(row, branch.to(), 1));
    edges.get(branch.to()).add(new Edge(row, branch.from(), -1));
    return true;
  }

  private int find(int node) {
    int root = node;
    while (joined[root] != root) {
      joined[root] = joined[joined[root]];
      root = joined[root];
    }
    return root;
  }

  /** Fixes for every node the way up to the root of its tree. */
  void root() {
    Arrays.fill(depth, -1);
    Deque<Integer> open = new ArrayDeque<>();
    for (int start = 0; start < depth.length; start++) {
      if (depth[start] >= 0) {
        continue;
      }
      depth[start] = 0;
      open.add(start);
      while (!open.isEmpty()) {
        int node = open.remove();
        for (Edge edge : edges.get(node)) {
          if (depth[edge.to] < 0) {
            depth[edge.to] = depth[node] + 1;
            up[edge.to] = new Edge(edge.row, node, -edge.sign);
            open.add(edge.to);
          }
        }
      }
    }
  }

  /** Writes the way from the link's {@code from} to its {@code to} into its column of F. */
  void walk(CircuitBranch link, int column, byte[][] f) {
    int a = link.from();
    int b = link.to();
    while (a != b && depth[a] + depth[b] > 0) {
      if (depth[a] >= depth[b]) {
        f[up[a].row][column] += (byte) up[a].sign;
        a = up[a].to;
      } else {
        f[up[b].row][column] -= (byte) up[b].sign;
        b = up[b].to;
      }
    }
  }
}
