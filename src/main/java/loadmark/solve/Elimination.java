package loadmark.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The order in which nodes are eliminated and what each elimination touches, worked out once for a
 * graph: of the nodes that need not be kept, always one with the fewest neighbours (Markowitz, The
 * elimination form of the inverse and its application to linear programming, 1957). The branches
 * are numbered: first those given, then those that eliminations make. Immutable.
 */
final class Elimination {

  /** The elimination of one node: it and the branches around it go. */
  static final class Star {
    final int node;

    /** The nodes around it. */
    final int[] neighbours;

    /** The branches to them. */
    final int[] members;

    /** How many additions have made each of those branches. */
    final int[] additions;

    /**
     * For each pair of neighbours, (0, 1), (0, 2), …, (1, 2), …, the branch between them; its
     * complement where this elimination makes it.
     */
    final int[] targets;

    private Star(int node, int[] neighbours, int[] members, int[] additions, int[] targets) {
      this.node = node;
      this.neighbours = neighbours;
      this.members = members;
      this.additions = additions;
      this.targets = targets;
    }
  }

  private final int given;
  private final Star[] stars;
  private final int[][] around;
  private final int[][] branch;
  private final int[] degree;
  private int branches;
  private int[] additions;

  /**
   * Works out the elimination.
   *
   * @param first the first node of each given branch; no two may join the same nodes
   * @param second the second
   * @param made how many additions have made each already
   * @param kept whether a node stays
   */
  Elimination(int[] first, int[] second, int[] made, boolean[] kept) {
    int nodes = kept.length;
    given = first.length;
    around = new int[nodes][4];
    branch = new int[nodes][4];
    degree = new int[nodes];
    additions = made.clone();
    for (int i = 0; i < given; i++) {
      add(first[i], second[i]);
    }
    List<Star> found = new ArrayList<>(nodes);
    boolean[] gone = kept.clone();
    for (int node = next(gone); node >= 0; node = next(gone)) {
      gone[node] = true;
      found.add(eliminate(node));
    }
    stars = found.toArray(new Star[0]);
  }

  /** Of those with the fewest neighbours the last: the farthest from the port, as a rule. */
  private int next(boolean[] gone) {
    int best = -1;
    for (int i = degree.length - 1; i >= 0; i--) {
      if (!gone[i] && (best < 0 || degree[i] < degree[best])) {
        best = i;
      }
    }
    return best;
  }

  private Star eliminate(int node) {
    int size = degree[node];
    int[] neighbours = Arrays.copyOf(around[node], size);
    int[] members = Arrays.copyOf(branch[node], size);
    int[] made = new int[size];
    for (int i = 0; i < size; i++) {
      made[i] = additions[members[i]];
      detach(neighbours[i], node);
    }
    degree[node] = 0;
    int[] targets = new int[size * (size - 1) / 2];
    int pair = 0;
    for (int i = 0; i < size; i++) {
      for (int j = i + 1; j < size; j++) {
        int target = left(neighbours[i], neighbours[j]);
        if (target < 0) {
          target = ~add(neighbours[i], neighbours[j]);
        } else {
          additions[target]++;
        }
        targets[pair++] = target;
      }
    }
    return new Star(node, neighbours, members, made, targets);
  }

  private int add(int a, int b) {
    if (branches == additions.length) {
      additions = Arrays.copyOf(additions, 2 * branches + 4);
    }
    attach(a, b);
    attach(b, a);
    return branches++;
  }

  private void attach(int from, int to) {
    if (degree[from] == around[from].length) {
      around[from] = Arrays.copyOf(around[from], 2 * degree[from]);
      branch[from] = Arrays.copyOf(branch[from], 2 * degree[from]);
    }
    around[from][degree[from]] = to;
    branch[from][degree[from]++] = branches;
  }

  private void detach(int from, int to) {
    int[] neighbours = around[from];
    int i = 0;
    while (neighbours[i] != to) {
      i++;
    }
    int last = --degree[from];
    neighbours[i] = neighbours[last];
    branch[from][i] = branch[from][last];
  }

  /** The branch that is left between two nodes in the end; −1 if there is none. */
  int left(int a, int b) {
    int from = degree[a] <= degree[b] ? a : b;
    int to = from == a ? b : a;
    for (int i = 0; i < degree[from]; i++) {
      if (around[from][i] == to) {
        return branch[from][i];
      }
    }
    return -1;
  }

  /** The eliminations in their order. */
  Star[] stars() {
    return stars;
  }

  int nodes() {
    return degree.length;
  }

  /** How many branches are given. */
  int given() {
    return given;
  }

  /** How many branches there are in all, given and made. */
  int branches() {
    return branches;
  }

  /** How many additions have made a branch in the end. */
  int additions(int number) {
    return additions[number];
  }
}
