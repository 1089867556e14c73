package loadmark.response;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
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
    List<Inverse> poor = new ArrayList<>();
    for (double shift : shifts) {
      Inverse inverse = invert(p, r, shift);
      Optional<List<Complex>> found =
          inverse.condition < GOOD_CONDITION ? inverse.findEigenvalues(r) : Optional.empty();
      if (found.isPresent()) {
        return found.get();
      }
      poor.add(inverse);
    }
    return poor.stream()
        .filter(inverse -> Double.isFinite(inverse.condition))
        .sorted(Comparator.comparingDouble(Inverse::condition))
        .flatMap(inverse -> inverse.findEigenvalues(r).stream())
        .findFirst()
        .orElseThrow(() -> new ArithmeticException("no eigenvalues of a pencil of " + p.numRows));
  }

  /** The inverse at a shift; without one the condition is infinite. */
  private record Inverse(double shift, double condition, DMatrixRMaj matrix) {

    Optional<List<Complex>> findEigenvalues(DMatrixRMaj r) {
      DMatrixRMaj t = new DMatrixRMaj(r.numRows, r.numCols);
      CommonOps_DDRM.mult(matrix, r, t);
      // Away from 0, where those of infinity gather and the iteration would not tell them apart.
      double moved = 1 / shift;
      for (int i = 0; i < t.numRows; i++) {
        t.add(i, i, moved);
      }
      return Eigenvalues.find(Balance.of(t))
          .map(
              all ->
                  all.stream()
                      .map(eigenvalue -> eigenvalue.subtract(moved))
                      .filter(theta -> theta.abs() > 0)
                      .map(theta -> theta.reciprocal().negate().add(shift))
                      .toList());
    }
  }

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
