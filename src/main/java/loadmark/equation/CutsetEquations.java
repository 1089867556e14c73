package loadmark.equation;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Kirchhoff's laws of a circuit on a spanning tree, with one real matrix and no element value in
 * it.
 *
 * <p>With the voltages v_t of the tree's branches and the currents i_l of the links, the others
 * follow as v_l = Fᵀ·v_t and i_t = −F·i_l, F being +1, −1 or 0 (Seshu and Reed, Linear Graphs and
 * Electrical Networks, 1961, ch. 4). The tree is the one of the smallest impedances at a real
 * complex frequency, so that no link is of lower impedance than a branch of the tree in its loop;
 * element values are never added to each other, and a small one is not lost beside a large one.
 */
public final class CutsetEquations {
  private final List<CircuitBranch> tree;
  private final List<CircuitBranch> links;
  private final int[] place;
  private final byte[][] f;

  private CutsetEquations(
      List<CircuitBranch> tree, List<CircuitBranch> links, int[] place, byte[][] f) {
    this.tree = tree;
    this.links = links;
    this.place = place;
    this.f = f;
  }

  /**
   * The equations of a circuit on its tree at {@code s} rad/s, real, above 0. Its branches are
   * numbered: the sources first, then the elements. A part that nothing joins to the rest floats at
   * a voltage that doesn't matter; a {@code SHORT} across a short is a link.
   */
  public static CutsetEquations at(Circuit circuit, double s) {
    List<CircuitBranch> all = new ArrayList<>(circuit.sources());
    all.addAll(circuit.elements());
    Integer[] order = new Integer[all.size()];
    for (int i = 0; i < order.length; i++) {
      order[i] = i;
    }
    double[] ohm = all.stream().mapToDouble(b -> b.resistance(s)).toArray();
    java.util.Arrays.sort(order, Comparator.comparingDouble(i -> ohm[i]));
    Forest forest = new Forest(circuit.nodes());
    List<CircuitBranch> tree = new ArrayList<>();
    List<CircuitBranch> links = new ArrayList<>();
    int[] place = new int[order.length];
    for (int i : order) {
      CircuitBranch branch = all.get(i);
      boolean inTree = branch.kind() != CircuitBranch.Kind.OPEN && forest.join(branch, tree.size());
      place[i] = inTree ? tree.size() : -1 - links.size();
      (inTree ? tree : links).add(branch);
    }
    byte[][] f = new byte[tree.size()][links.size()];
    forest.root();
    for (int l = 0; l < links.size(); l++) {
      forest.walk(links.get(l), l, f);
    }
    return new CutsetEquations(tree, links, place, f);
  }

  /** The tree's branches, in the order of the rows of F. */
  public List<CircuitBranch> tree() {
    return tree;
  }

  /** The links, in the order of the columns of F. */
  public List<CircuitBranch> links() {
    return links;
  }

  /** Where the circuit's branch stands: row k of F as k, column k as −1 − k. */
  public int place(int branch) {
    return place[branch];
  }

  /** The entry of F. */
  public int sign(int row, int column) {
    return f[row][column];
  }
}
