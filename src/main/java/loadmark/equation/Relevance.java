package loadmark.equation;

import java.util.Arrays;

/**
 * Finds the branches that can carry current between a port's two nodes, whatever their values:
 * those in one biconnected component with a branch across the port (Hopcroft and Tarjan, Algorithm
 * 447: efficient algorithms for graph manipulation, 1973).
 */
final class Relevance {
  private static final int NONE = -1;

  private final int plus;
  private final int minus;
  private final int[] head;
  private int[] next = new int[32];
  private int[] end = new int[32];
  private int ends;

  Relevance(int nodes, int plus, int minus) {
    this.plus = plus;
    this.minus = minus;
    head = new int[nodes];
    Arrays.fill(head, NONE);
  }

  void add(int a, int b) {
    if (ends == end.length) {
      next = Arrays.copyOf(next, 2 * ends);
      end = Arrays.copyOf(end, 2 * ends);
    }
    attach(a, b);
    attach(b, a);
  }

  /** Half 2i of branch i leaves its first node, half 2i + 1 its second. */
  private void attach(int from, int to) {
    end[ends] = to;
    next[ends] = head[from];
    head[from] = ends++;
  }

  /** For each branch in the order added. */
  boolean[] find() {
    boolean[] relevant = new boolean[ends / 2];
    if (plus == minus) {
      return relevant;
    }
    int nodes = head.length;
    int[] found = new int[nodes];
    int[] low = new int[nodes];
    int[] cursor = head.clone();
    int[] path = new int[nodes];
    int[] open = new int[ends / 2];
    int[] base = new int[nodes];
    int opened = 0;
    int depth = 0;
    int time = 2;
    // The walk starts at minus, entered from plus by the branch across the port.
    found[plus] = 1;
    found[minus] = low[minus] = time;
    path[0] = minus;
    boolean[] used = new boolean[ends / 2];
    while (depth >= 0) {
      int node = path[depth];
      int half = cursor[node];
      if (half == NONE) {
        depth--;
        if (depth >= 0) {
          int parent = path[depth];
          low[parent] = Math.min(low[parent], low[node]);
          if (low[node] >= found[parent]) {
            opened = base[node];
          }
        }
        continue;
      }
      cursor[node] = next[half];
      int branch = half / 2;
      int to = end[half];
      if (used[branch] || to == node) {
        continue;
      }
      used[branch] = true;
      int before = opened;
      open[opened++] = branch;
      if (found[to] == 0) {
        found[to] = low[to] = ++time;
        base[to] = before;
        path[++depth] = to;
      } else {
        low[node] = Math.min(low[node], found[to]);
      }
    }
    for (int i = 0; i < opened; i++) {
      relevant[open[i]] = true;
    }
    return relevant;
  }
}
