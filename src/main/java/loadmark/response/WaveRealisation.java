package loadmark.response;

import java.util.List;
import java.util.stream.IntStream;
import loadmark.equation.Circuit;
import loadmark.equation.CircuitBranch;
import loadmark.equation.CutsetEquations;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/**
 * A circuit as a state space in ζ = (s + s0)/(s − s0), s0 real and above 0, one state a reactive
 * element.
 *
 * <p>With the wave variables of every element on its own impedance at s0, a resistor reflects
 * nothing, an inductor 1/ζ and a capacitor −1/ζ of what comes in (Fettweis, Wave Digital Filters:
 * Theory and Practice, Proc. IEEE 74(2), 1986). What joins them is lossless, so that A is a
 * contraction and the equations to be solved are 1 + S with S skew-symmetric and no entry above 1,
 * whatever the values of the elements: nothing has to be scaled, resistors cost no state, and loops
 * of capacitors or meshes of inductors need no care. The axis s = jω is the circle |ζ| = 1.
 */
final class WaveRealisation {
  private final Circuit circuit;
  private final CutsetEquations equations;
  private final double[] treeRoot;
  private final double[] linkRoot;

  private WaveRealisation(Circuit circuit, double s0) {
    this.circuit = circuit;
    equations = CutsetEquations.at(circuit, s0);
    treeRoot = roots(equations.tree(), s0);
    linkRoot = roots(equations.links(), s0);
  }

  /**
   * From every source to every source: the inputs are the voltages of shorts (V) and the currents
   * of opens (A), the outputs the currents through shorts and the voltages across opens, each from
   * the branch's {@code from} to its {@code to}.
   *
   * @param s0 rad/s
   */
  static StateSpace of(Circuit circuit, double s0) {
    WaveRealisation realisation = new WaveRealisation(circuit, s0);
    int[] states = realisation.elements(true);
    return realisation.read(realisation.solve(states), states);
  }

  /**
   * From the port to the powers of all resistors: each output squared is the power (W) that a
   * resistor takes up, so that the real part of the port's impedance or admittance is a sum of
   * positive terms, however small it is beside the imaginary part.
   *
   * @param s0 rad/s
   */
  static StateSpace powers(Circuit circuit, double s0) {
    WaveRealisation realisation = new WaveRealisation(circuit, s0);
    int[] states = realisation.elements(true);
    DMatrixRMaj waves = realisation.solve(states);
    StateSpace port = realisation.read(waves, states).part(0, 0, -1);
    int[] resistors = realisation.elements(false);
    int n = states.length;
    DMatrixRMaj c = new DMatrixRMaj(resistors.length, n);
    DMatrixRMaj d = new DMatrixRMaj(resistors.length, 1);
    for (int k = 0; k < resistors.length; k++) {
      int row = realisation.row(resistors[k] + circuit.sources().size());
      for (int j = 0; j < n; j++) {
        c.set(k, j, waves.get(row, j));
      }
      d.set(k, 0, waves.get(row, n));
    }
    return new StateSpace(port.a(), port.b(), c, d);
  }

  private int[] elements(boolean reactive) {
    return IntStream.range(0, circuit.elements().size())
        .filter(i -> circuit.elements().get(i).kind().isReactive() == reactive)
        .toArray();
  }

  private static double[] roots(List<CircuitBranch> branches, double s0) {
    return branches.stream().mapToDouble(b -> Math.sqrt(b.resistance(s0))).toArray();
  }

  private int row(int branch) {
    int place = equations.place(branch);
    return place >= 0 ? place : treeRoot.length - 1 - place;
  }

  private DMatrixRMaj solve(int[] states) {
    int sources = circuit.sources().size();
    int n = states.length;
    DMatrixRMaj right = new DMatrixRMaj(treeRoot.length + linkRoot.length, n + sources);
    for (int k = 0; k < n; k++) {
      reflect(states[k] + sources, right, k);
    }
    for (int k = 0; k < sources; k++) {
      drive(k, right, n + k);
    }
    DMatrixRMaj waves = new DMatrixRMaj(right.numRows, right.numCols);
    LinearSolverDense<DMatrixRMaj> solver = LinearSolverFactory_DDRM.lu(right.numRows);
    if (!solver.setA(matrix())) {
      throw new ArithmeticException("1 + S is singular");
    }
    solver.solve(right, waves);
    return waves;
  }

  /** An element takes part; sources are given and do not. */
  private static boolean carries(CircuitBranch branch) {
    return branch.kind() != CircuitBranch.Kind.SHORT && branch.kind() != CircuitBranch.Kind.OPEN;
  }

  private double weight(int t, int l) {
    int sign = equations.sign(t, l);
    boolean both = carries(equations.tree().get(t)) && carries(equations.links().get(l));
    return sign == 0 || !both ? 0 : sign * treeRoot[t] / linkRoot[l];
  }

  /** Rows and columns: the tree's branches, then the links; a source's is that of 1. */
  private DMatrixRMaj matrix() {
    int trees = treeRoot.length;
    DMatrixRMaj w = new DMatrixRMaj(trees + linkRoot.length, trees + linkRoot.length);
    for (int i = 0; i < w.numRows; i++) {
      w.set(i, i, 1);
    }
    for (int t = 0; t < trees; t++) {
      for (int l = 0; l < linkRoot.length; l++) {
        double f = weight(t, l);
        w.set(t, trees + l, f);
        w.set(trees + l, t, -f);
      }
    }
    return w;
  }

  /** The right side for a wave of 1 that comes back from an element. */
  private void reflect(int branch, DMatrixRMaj right, int column) {
    int trees = treeRoot.length;
    int place = equations.place(branch);
    if (place >= 0) {
      right.set(place, column, 1);
      for (int l = 0; l < linkRoot.length; l++) {
        right.set(trees + l, column, weight(place, l));
      }
    } else {
      int link = -1 - place;
      right.set(trees + link, column, -1);
      for (int t = 0; t < trees; t++) {
        right.set(t, column, weight(t, link));
      }
    }
  }

  /** The right side for a source of 1 V or 1 A. */
  private void drive(int branch, DMatrixRMaj right, int column) {
    int trees = treeRoot.length;
    int place = equations.place(branch);
    CircuitBranch.Kind kind = circuit.sources().get(branch).kind();
    if (kind == CircuitBranch.Kind.SHORT && place >= 0) {
      for (int l = 0; l < linkRoot.length; l++) {
        if (carries(equations.links().get(l))) {
          right.set(trees + l, column, equations.sign(place, l) / linkRoot[l]);
        }
      }
    } else if (kind == CircuitBranch.Kind.OPEN) {
      for (int t = 0; t < trees; t++) {
        if (carries(equations.tree().get(t))) {
          right.set(t, column, -equations.sign(t, -1 - place) * treeRoot[t]);
        }
      }
    }
  }

  private StateSpace read(DMatrixRMaj waves, int[] states) {
    int n = states.length;
    int sources = circuit.sources().size();
    DMatrixRMaj a = new DMatrixRMaj(n, n);
    DMatrixRMaj b = new DMatrixRMaj(n, sources);
    DMatrixRMaj c = new DMatrixRMaj(sources, n);
    DMatrixRMaj d = new DMatrixRMaj(sources, sources);
    for (int k = 0; k < n; k++) {
      int row = row(states[k] + sources);
      int sign = circuit.elements().get(states[k]).kind() == CircuitBranch.Kind.INDUCTOR ? 1 : -1;
      for (int j = 0; j < n; j++) {
        a.set(k, j, sign * waves.get(row, j));
      }
      for (int j = 0; j < sources; j++) {
        b.set(k, j, sign * waves.get(row, n + j));
      }
    }
    for (int k = 0; k < sources; k++) {
      for (int j = 0; j < n; j++) {
        c.set(k, j, measure(k, waves, j, row(states[j] + sources), -1));
      }
      for (int j = 0; j < sources; j++) {
        d.set(k, j, measure(k, waves, n + j, -1, j));
      }
    }
    return new StateSpace(a, b, c, d);
  }

  /**
   * What source {@code k} measures in one column of the solution.
   *
   * @param back the row from which a wave of 1 comes back, or −1
   * @param driven the source that is 1 V or 1 A, or −1
   */
  private double measure(int k, DMatrixRMaj waves, int column, int back, int driven) {
    int trees = treeRoot.length;
    int place = equations.place(k);
    double sum = 0;
    if (circuit.sources().get(k).kind() == CircuitBranch.Kind.OPEN) {
      for (int t = 0; t < trees; t++) {
        int sign = equations.sign(t, -1 - place);
        if (sign != 0 && carries(equations.tree().get(t))) {
          sum += sign * treeRoot[t] * (waves.get(t, column) + (back == t ? 1 : 0));
        } else if (sign != 0 && driven >= 0 && equations.place(driven) == t) {
          sum += sign;
        }
      }
    } else if (place >= 0) {
      for (int l = 0; l < linkRoot.length; l++) {
        int sign = equations.sign(place, l);
        if (sign != 0 && carries(equations.links().get(l))) {
          sum -= sign * (waves.get(trees + l, column) - (back == trees + l ? 1 : 0)) / linkRoot[l];
        } else if (sign != 0 && driven >= 0 && equations.place(driven) == -1 - l) {
          sum -= sign;
        }
      }
    }
    return sum;
  }
}
