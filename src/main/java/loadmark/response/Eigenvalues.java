package loadmark.response;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.exception.MathArithmeticException;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.ejml.data.Complex_F64;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;

/** The eigenvalues of a real square matrix. */
final class Eigenvalues {
  private Eigenvalues() {}

  /**
   * All of them.
   *
   * @throws ArithmeticException where the iteration does not converge
   */
  static List<Complex> of(DMatrixRMaj matrix) {
    return find(matrix)
        .orElseThrow(
            () -> new ArithmeticException("no eigenvalues of a matrix of " + matrix.numRows));
  }

  /** All of them; by a second library where the first one's iteration does not converge. */
  static Optional<List<Complex>> find(DMatrixRMaj matrix) {
    if (matrix.numRows == 0) {
      return Optional.of(List.of());
    }
    EigenDecomposition_F64<DMatrixRMaj> eigen =
        DecompositionFactory_DDRM.eig(matrix.numRows, false);
    if (!eigen.decompose(matrix.copy())) {
      return bySecondLibrary(matrix);
    }
    List<Complex> found = new ArrayList<>();
    for (int i = 0; i < eigen.getNumberOfEigenvalues(); i++) {
      Complex_F64 value = eigen.getEigenvalue(i);
      found.add(new Complex(value.real, value.imaginary));
    }
    return Optional.of(found);
  }

  private static Optional<List<Complex>> bySecondLibrary(DMatrixRMaj matrix) {
    double[][] rows = new double[matrix.numRows][];
    for (int i = 0; i < rows.length; i++) {
      rows[i] = Arrays.copyOfRange(matrix.data, i * rows.length, (i + 1) * rows.length);
    }
    try {
      EigenDecomposition eigen = new EigenDecomposition(new Array2DRowRealMatrix(rows, false));
      List<Complex> found = new ArrayList<>();
      for (int i = 0; i < rows.length; i++) {
        found.add(new Complex(eigen.getRealEigenvalue(i), eigen.getImagEigenvalue(i)));
      }
      return Optional.of(found);
    } catch (MathIllegalStateException | MathArithmeticException notFound) {
      return Optional.empty();
    }
  }
}
