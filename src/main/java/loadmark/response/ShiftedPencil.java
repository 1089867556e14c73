package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.NormOps_DDRM;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/** The eigenvalues λ of a real pencil P + λ·R by inverting it at one of several real shifts. */
final class ShiftedPencil {
  /** A conditioning that leaves ten digits, so that no other shift has to be tried. */
  private static final double GOOD_CONDITION = 1e6;

  private ShiftedPencil() {}

  /**
   * All finite eigenvalues, best near the shifts. The first shift that is well conditioned is
   * taken, else the best.
   *
   * @throws ArithmeticException where the pencil is singular everywhere, or the eigenvalues did not
   *     come out
   */
  static List<Complex> eigenvalues(DMatrixRMaj p, DMatrixRMaj r, double[] shifts) {
    Inverse best = new Inverse(0, Double.POSITIVE_INFINITY, p);
    for (double shift : shifts) {
      Inverse next = invert(p, r, shift);
      best = next.condition < best.condition ? next : best;
      if (best.condition < GOOD_CONDITION) {
        break;
      }
    }
    if (Double.isInfinite(best.condition)) {
      throw new ArithmeticException("the pencil is singular everywhere");
    }
    DMatrixRMaj t = new DMatrixRMaj(p.numRows, p.numCols);
    CommonOps_DDRM.mult(best.matrix, r, t);
    // Moved away from 0, where those of infinity gather and the iteration would not tell them
    // apart.
    double moved = 1 / best.shift;
    for (int i = 0; i < t.numRows; i++) {
      t.add(i, i, moved);
    }
    List<Complex> found = new ArrayList<>();
    for (Complex eigenvalue : Eigenvalues.of(Balance.of(t))) {
      Complex theta = eigenvalue.subtract(moved);
      if (theta.abs() > 0) {
        found.add(new Complex(best.shift).subtract(theta.reciprocal()));
      }
    }
    return found;
  }

  /** The inverse at a shift; without one the condition is infinite. */
  private record Inverse(double shift, double condition, DMatrixRMaj matrix) {}

  private static Inverse invert(DMatrixRMaj p, DMatrixRMaj r, double shift) {
    DMatrixRMaj at = new DMatrixRMaj(p.numRows, p.numCols);
    CommonOps_DDRM.add(p, shift, r, at);
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
}
