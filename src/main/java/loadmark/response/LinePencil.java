package loadmark.response;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;

/**
 * Where real and imaginary part of a response lie on a line: im·Im F − re·Re F = constant +
 * slope·ω/s0.
 *
 * <p>With a real input the states' real and imaginary parts are apart, and (s + s0)·x = (s −
 * s0)·(A·x + B·u) at s = jω is a real pencil in ω of twice the order, whose real eigenvalues are
 * the crossings. Those at −ω are the crossings of −im and −slope.
 */
record LinePencil(double im, double re, double constant, double slope) {
  /** In parts of s0; at negative frequencies, where the crossings are not those that are sought. */
  private static final double[] SHIFTS = {-1, -0.5, -2, -0.25, -4, -0.7, 0.01};

  /** The phase of F is ±{@code degrees}. */
  static LinePencil ofPhase(double degrees) {
    double radians = Math.toRadians(degrees);
    return new LinePencil(Math.cos(radians), Math.sin(radians), 0, 0);
  }

  /**
   * All finite eigenvalues ω/s0.
   *
   * @param system of one input and one output
   * @throws ArithmeticException where the condition holds everywhere, or the eigenvalues did not
   *     come out
   */
  List<Complex> eigenvalues(StateSpace system) {
    StateSpace f = Balance.of(system);
    int n = f.states();
    DMatrixRMaj p = new DMatrixRMaj(2 * n + 1, 2 * n + 1);
    DMatrixRMaj r = new DMatrixRMaj(2 * n + 1, 2 * n + 1);
    DMatrixRMaj sum = CommonOps_DDRM.identity(n);
    DMatrixRMaj difference = CommonOps_DDRM.identity(n);
    CommonOps_DDRM.addEquals(sum, f.a());
    CommonOps_DDRM.subtractEquals(difference, f.a());
    CommonOps_DDRM.insert(sum, p, 0, 0);
    CommonOps_DDRM.insert(f.b(), p, 0, 2 * n);
    CommonOps_DDRM.insert(sum, p, n, n);
    CommonOps_DDRM.insert(difference, r, n, 0);
    CommonOps_DDRM.insert(scaled(-1, f.b()), r, n, 2 * n);
    CommonOps_DDRM.insert(scaled(-1, difference), r, 0, n);
    CommonOps_DDRM.insert(scaled(-re, f.c()), p, 2 * n, 0);
    CommonOps_DDRM.insert(scaled(im, f.c()), p, 2 * n, n);
    p.set(2 * n, 2 * n, -re * f.d().get(0, 0) - constant);
    r.set(2 * n, 2 * n, -slope);
    return ShiftedPencil.eigenvalues(p, r, SHIFTS);
  }

  private static DMatrixRMaj scaled(double factor, DMatrixRMaj matrix) {
    DMatrixRMaj result = matrix.copy();
    CommonOps_DDRM.scale(factor, result);
    return result;
  }
}
