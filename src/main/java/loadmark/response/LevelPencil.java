package loadmark.response;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;

/**
 * Where a quadratic form of a system's outputs vanishes on the circle |ζ| = 1.
 *
 * <p>On the circle the adjoint of the system is the system in 1/ζ, so that y*·Q·y is zero exactly
 * where the pencil with the rows
 *
 * <pre>
 *   (A − ζ)·x + B·u
 *   −λ + ζ·(Aᵀ·λ + Cᵀ·Q·(C·x + D·u))
 *   Bᵀ·λ + Dᵀ·Q·(C·x + D·u)
 * </pre>
 *
 * is singular (Boyd, Balakrishnan and Kabamba, A Bisection Method for Computing the H∞ Norm of a
 * Transfer Matrix, Math. Control Signals Systems 2, 1989; Bruinsma and Steinbuch, A Fast Algorithm
 * to Compute the H∞-Norm, Systems and Control Letters 14, 1990). |H| = γ is the form of the outputs
 * H and 1 with Q = diag(1, −γ²).
 */
final class LevelPencil {
  /** Real, and off the circle; what their mirror images would give is the same. */
  private static final double[] SHIFTS = {-2, 2, -4, 4, -1.4, 1.4, 20};

  private LevelPencil() {}

  /**
   * All finite eigenvalues ζ.
   *
   * @param q outputs × outputs, symmetric
   * @throws ArithmeticException where the form is zero everywhere, or the eigenvalues did not come
   *     out
   */
  static List<Complex> eigenvalues(StateSpace system, DMatrixRMaj q) {
    StateSpace s = Balance.of(system);
    int states = s.states();
    int size = 2 * states + s.inputs();
    DMatrixRMaj qc = product(q, s.c());
    DMatrixRMaj qd = product(q, s.d());
    DMatrixRMaj n = new DMatrixRMaj(size, size);
    DMatrixRMaj m = new DMatrixRMaj(size, size);
    CommonOps_DDRM.insert(s.a(), n, 0, 0);
    CommonOps_DDRM.insert(s.b(), n, 0, 2 * states);
    CommonOps_DDRM.insert(transposedProduct(s.d(), qc), n, 2 * states, 0);
    CommonOps_DDRM.insert(CommonOps_DDRM.transpose(s.b(), null), n, 2 * states, states);
    CommonOps_DDRM.insert(transposedProduct(s.d(), qd), n, 2 * states, 2 * states);
    CommonOps_DDRM.insert(transposedProduct(s.c(), qc), m, states, 0);
    CommonOps_DDRM.insert(CommonOps_DDRM.transpose(s.a(), null), m, states, states);
    CommonOps_DDRM.insert(transposedProduct(s.c(), qd), m, states, 2 * states);
    for (int i = 0; i < states; i++) {
      m.set(i, i, -1);
      n.set(states + i, states + i, -1);
    }
    return ShiftedPencil.eigenvalues(n, m, SHIFTS);
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
