package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.NormOps_DDRM;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/**
 * Where a quadratic form of a system's outputs is singular on the circle |ζ| = 1.
 *
 * <p>With y the outputs for the inputs u, the form u*·Y*·Q·Y·u is singular exactly where the pencil
 * N + ζ·M of the code below is, since the adjoint of the system on the circle is the system in 1/ζ
 * (Boyd, Balakrishnan and Kabamba, A Bisection Method for Computing the H∞ Norm of a Transfer
 * Matrix, Math. Control Signals Systems 2, 1989; in this form: Hinrichsen and Son, Int. J. Robust
 * Nonlinear Control 1, 1991). |H| = γ is the form of the outputs H and 1 with Q = diag(1, −γ²).
 */
final class LevelPencil {
  /** Where the pencil may be inverted: real, mirrored in the circle by what they leave out. */
  private static final double[] SHIFTS = {Double.POSITIVE_INFINITY, -2, 2, -5, 5, -1.4, 1.4};

  /** A conditioning that leaves ten digits, so that no other shift has to be tried. */
  private static final double GOOD_CONDITION = 1e6;

  private final DMatrixRMaj n;
  private final DMatrixRMaj m;

  private final int inputs;

  private LevelPencil(DMatrixRMaj n, DMatrixRMaj m, int inputs) {
    this.n = n;
    this.m = m;
    this.inputs = inputs;
  }

  /**
   * All eigenvalues that are finite.
   *
   * @param q outputs × outputs, symmetric
   * @throws ArithmeticException where the form is singular everywhere, or the eigenvalues did not
   *     come out
   */
  static List<Complex> eigenvalues(StateSpace system, DMatrixRMaj q) {
    return of(Balance.of(system), q).eigenvalues();
  }

  private static LevelPencil of(StateSpace s, DMatrixRMaj q) {
    int states = s.states();
    int inputs = s.inputs();
    int size = 2 * states + inputs;
    DMatrixRMaj qc = product(q, s.c());
    DMatrixRMaj qd = product(q, s.d());
    DMatrixRMaj n = new DMatrixRMaj(size, size);
    DMatrixRMaj m = new DMatrixRMaj(size, size);
    insert(s.a(), n, 0, 0);
    insert(s.b(), n, 0, 2 * states);
    insert(transposedProduct(s.d(), qc), n, 2 * states, 0);
    insert(CommonOps_DDRM.transpose(s.b(), null), n, 2 * states, states);
    insert(transposedProduct(s.d(), qd), n, 2 * states, 2 * states);
    insert(transposedProduct(s.c(), qc), m, states, 0);
    insert(CommonOps_DDRM.transpose(s.a(), null), m, states, states);
    insert(transposedProduct(s.c(), qd), m, states, 2 * states);
    for (int i = 0; i < states; i++) {
      m.set(i, i, -1);
      n.set(states + i, states + i, -1);
    }
    return new LevelPencil(n, m, inputs);
  }

  private List<Complex> eigenvalues() {
    Inverse best = new Inverse(0, Double.POSITIVE_INFINITY, n);
    for (double shift : SHIFTS) {
      Inverse next = invert(shift);
      best = next.condition < best.condition ? next : best;
      if (best.condition < GOOD_CONDITION) {
        break;
      }
    }
    if (Double.isInfinite(best.condition)) {
      throw new ArithmeticException("the form is singular at every frequency");
    }
    boolean infinite = Double.isInfinite(best.shift);
    DMatrixRMaj t = product(best.matrix, infinite ? rows(false) : m);
    List<Complex> found = new ArrayList<>();
    for (Complex theta : Eigenvalues.of(Balance.of(t))) {
      if (infinite) {
        found.add(theta.negate());
      } else if (theta.abs() > 0) {
        found.add(new Complex(best.shift).subtract(theta.reciprocal()));
      }
    }
    return found;
  }

  /** The inverse at a shift, infinite in condition where there is none. */
  private record Inverse(double shift, double condition, DMatrixRMaj matrix) {}

  /** The inverse of N + shift·M, or of its dynamic rows' M at infinity rows there. */
  private Inverse invert(double shift) {
    DMatrixRMaj at = new DMatrixRMaj(n.numRows, n.numCols);
    if (Double.isInfinite(shift)) {
      CommonOps_DDRM.add(m, rows(true), at);
    } else {
      CommonOps_DDRM.add(n, shift, m, at);
    }
    double norm = NormOps_DDRM.inducedPInf(at);
    LinearSolverDense<DMatrixRMaj> solver = LinearSolverFactory_DDRM.lu(at.numRows);
    if (!solver.setA(at)) {
      return new Inverse(shift, Double.POSITIVE_INFINITY, at);
    }
    DMatrixRMaj inverse = new DMatrixRMaj(at.numRows, at.numCols);
    solver.invert(inverse);
    double condition = norm * NormOps_DDRM.inducedPInf(inverse);
    boolean regular = Double.isFinite(condition);
    return new Inverse(shift, regular ? condition : Double.POSITIVE_INFINITY, inverse);
  }

  /** N with its algebraic rows alone, or with all others. */
  private DMatrixRMaj rows(boolean algebraic) {
    int from = n.numRows - inputs;
    DMatrixRMaj rows = new DMatrixRMaj(n.numRows, n.numCols);
    for (int i = algebraic ? from : 0; i < (algebraic ? n.numRows : from); i++) {
      System.arraycopy(n.data, i * n.numCols, rows.data, i * n.numCols, n.numCols);
    }
    return rows;
  }

  private static void insert(DMatrixRMaj from, DMatrixRMaj to, int row, int column) {
    CommonOps_DDRM.insert(from, to, row, column);
  }

  private static DMatrixRMaj product(DMatrixRMaj left, DMatrixRMaj right) {
    DMatrixRMaj product = new DMatrixRMaj(left.numRows, right.numCols);
    CommonOps_DDRM.mult(left, right, product);
    return product;
  }

  private static DMatrixRMaj transposedProduct(DMatrixRMaj left, DMatrixRMaj right) {
    DMatrixRMaj product = new DMatrixRMaj(left.numCols, right.numCols);
    CommonOps_DDRM.multTransA(left, right, product);
    return product;
  }
}
