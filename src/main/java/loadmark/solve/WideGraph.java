package loadmark.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The branches of one network at one frequency, to about 32 digits, eliminated like {@link
 * BranchBlock} but only where a node's branches do not nearly cancel; what is left is for others.
 */
final class WideGraph {
  /** A star is put off while its branches are more than this many times their sum. */
  private static final double MOST_GROWTH = 1e4;

  /** Rounding of one star, in units of 2⁻¹⁰². */
  private static final double FILL = 16;

  /**
   * An eliminated star: of each neighbour its share and how large the rounding of the branch is in
   * units of 2⁻¹⁰².
   */
  private static final class Star {
    final int node;
    final int[] neighbours;
    final double[] shareRe;
    final double[] shareIm;
    final double[] rounding;

    Star(int node, int[] neighbours) {
      this.node = node;
      this.neighbours = neighbours;
      shareRe = new double[neighbours.length];
      shareIm = new double[neighbours.length];
      rounding = new double[neighbours.length];
    }
  }

  private final int[][] around;
  private final int[][] branch;
  private final int[] degree;
  private final List<WideComplex> admittances = new ArrayList<>();
  private final List<Star> stars = new ArrayList<>();

  /** The sizes of all that was added up in each branch. */
  private double[] terms = new double[16];

  WideGraph(int nodes) {
    around = new int[nodes][4];
    branch = new int[nodes][4];
    degree = new int[nodes];
  }

  /** Adds a branch, beside any that is there. */
  void add(int a, int b, WideComplex y) {
    int number = find(a, b);
    if (number >= 0) {
      WideComplex sum = admittances.get(number).plus(y);
      terms[number] += y.size();
      boolean nothing = sum.size() <= WideLaw.NOTHING * terms[number];
      admittances.set(number, nothing ? WideComplex.ZERO : sum);
      return;
    }
    attach(a, b);
    attach(b, a);
    if (admittances.size() == terms.length) {
      terms = Arrays.copyOf(terms, 2 * terms.length);
    }
    terms[admittances.size()] = y.size();
    admittances.add(y);
  }

  private int find(int a, int b) {
    int from = degree[a] <= degree[b] ? a : b;
    int to = from == a ? b : a;
    for (int i = 0; i < degree[from]; i++) {
      if (around[from][i] == to) {
        return branch[from][i];
      }
    }
    return -1;
  }

  private void attach(int from, int to) {
    if (degree[from] == around[from].length) {
      around[from] = Arrays.copyOf(around[from], 2 * degree[from]);
      branch[from] = Arrays.copyOf(branch[from], 2 * degree[from]);
    }
    around[from][degree[from]] = to;
    branch[from][degree[from]++] = admittances.size();
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

  /**
   * Eliminates what can be eliminated safely.
   *
   * @param order nodes that need not be kept
   * @param kept nodes that must be, all the same
   * @return the nodes left of {@code order}, and kept ones of it
   */
  List<Integer> eliminate(Elimination.Star[] order, boolean[] kept) {
    List<Integer> left = new ArrayList<>();
    for (Elimination.Star star : order) {
      left.add(star.node);
    }
    int before;
    do {
      before = left.size();
      left.removeIf(node -> !kept[node] && eliminate(node));
    } while (left.size() < before && !left.isEmpty());
    return left;
  }

  private boolean eliminate(int node) {
    int size = degree[node];
    WideComplex sum = WideComplex.ZERO;
    double sizes = 0;
    for (int i = 0; i < size; i++) {
      WideComplex y = admittances.get(branch[node][i]);
      sum = sum.plus(y);
      sizes += y.size();
    }
    if (sizes > 0 && !(sizes <= MOST_GROWTH * sum.size())) {
      return false;
    }
    Star star = new Star(node, Arrays.copyOf(around[node], size));
    int[] members = Arrays.copyOf(branch[node], size);
    for (int neighbour : star.neighbours) {
      detach(neighbour, node);
    }
    degree[node] = 0;
    WideComplex inverse = sizes > 0 ? sum.inverse() : WideComplex.ZERO;
    for (int i = 0; i < size; i++) {
      WideComplex y = admittances.get(members[i]);
      WideComplex share = y.times(inverse);
      star.shareRe[i] = share.re().hi();
      star.shareIm[i] = share.im().hi();
      star.rounding[i] = y.isZero() ? 0 : (FILL + size) * y.size() * sizes / sum.size();
      for (int j = i + 1; j < size; j++) {
        WideComplex fill = share.times(admittances.get(members[j]));
        if (!fill.isZero()) {
          add(star.neighbours[i], star.neighbours[j], fill);
        }
      }
    }
    stars.add(star);
    return true;
  }

  /** The branches around a node, as the nodes at their other ends. */
  int[] neighbours(int node) {
    return Arrays.copyOf(around[node], degree[node]);
  }

  /** The branch between neighbours. */
  WideComplex admittance(int a, int b) {
    return admittances.get(find(a, b));
  }

  /**
   * How much the roundings of all eliminations change Σ λ·KCL, in units of 2⁻¹⁰²: Σ |y|·|Δv|·|Δλ|.
   *
   * @param volts voltages, re and im in turn; those of eliminated nodes are filled in
   * @param factors multipliers of the nodes' current laws, likewise
   */
  double rounding(double[] volts, double[] factors) {
    double sum = 0;
    for (int k = stars.size() - 1; k >= 0; k--) {
      Star star = stars.get(k);
      fill(star, volts);
      fill(star, factors);
      for (int i = 0; i < star.neighbours.length; i++) {
        int other = star.neighbours[i];
        sum +=
            star.rounding[i]
                * distance(volts, star.node, other)
                * distance(factors, star.node, other);
      }
    }
    return sum;
  }

  private static void fill(Star star, double[] volts) {
    double re = 0;
    double im = 0;
    for (int i = 0; i < star.neighbours.length; i++) {
      int other = star.neighbours[i];
      re += star.shareRe[i] * volts[2 * other] - star.shareIm[i] * volts[2 * other + 1];
      im += star.shareRe[i] * volts[2 * other + 1] + star.shareIm[i] * volts[2 * other];
    }
    volts[2 * star.node] = re;
    volts[2 * star.node + 1] = im;
  }

  private static double distance(double[] volts, int a, int b) {
    return Math.abs(volts[2 * a] - volts[2 * b]) + Math.abs(volts[2 * a + 1] - volts[2 * b + 1]);
  }
}
