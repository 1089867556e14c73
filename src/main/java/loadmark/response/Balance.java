package loadmark.response;

import org.ejml.data.DMatrixRMaj;

/**
 * Scales states by powers of two until rows and columns are of like size (Parlett and Reinsch,
 * Balancing a Matrix for Calculation of Eigenvalues and Eigenvectors, Numer. Math. 13, 1969). It
 * rounds nothing.
 */
final class Balance {
  private static final int MOST_SWEEPS = 30;

  private Balance() {}

  /** The same system with its states scaled, inputs and outputs as they were. */
  static StateSpace of(StateSpace system) {
    DMatrixRMaj a = system.a().copy();
    DMatrixRMaj b = system.b().copy();
    DMatrixRMaj c = system.c().copy();
    boolean moved = true;
    for (int sweep = 0; moved && sweep < MOST_SWEEPS; sweep++) {
      moved = false;
      for (int i = 0; i < a.numRows; i++) {
        double column = column(a, i, true) + column(c, i, false);
        double row = row(a, i, true) + row(b, i, false);
        if (column == 0 || row == 0) {
          continue;
        }
        double factor = Math.scalb(1.0, (int) Math.rint(log2(row / column) / 2));
        if (column * factor + row / factor < 0.95 * (column + row)) {
          moved = true;
          scaleColumn(a, i, factor);
          scaleColumn(c, i, factor);
          scaleRow(a, i, 1 / factor);
          scaleRow(b, i, 1 / factor);
        }
      }
    }
    return new StateSpace(a, b, c, system.d());
  }

  /** A square matrix of the same eigenvalues. */
  static DMatrixRMaj of(DMatrixRMaj a) {
    int n = a.numRows;
    DMatrixRMaj none = new DMatrixRMaj(0, 0);
    return of(new StateSpace(a, new DMatrixRMaj(n, 0), new DMatrixRMaj(0, n), none)).a();
  }

  private static double log2(double x) {
    return Math.log(x) / Math.log(2);
  }

  private static double column(DMatrixRMaj m, int column, boolean square) {
    double sum = 0;
    for (int i = 0; i < m.numRows; i++) {
      sum += square && i == column ? 0 : Math.abs(m.get(i, column));
    }
    return sum;
  }

  private static double row(DMatrixRMaj m, int row, boolean square) {
    double sum = 0;
    for (int j = 0; j < m.numCols; j++) {
      sum += square && j == row ? 0 : Math.abs(m.get(row, j));
    }
    return sum;
  }

  private static void scaleColumn(DMatrixRMaj m, int column, double factor) {
    for (int i = 0; i < m.numRows; i++) {
      m.set(i, column, m.get(i, column) * factor);
    }
  }

  private static void scaleRow(DMatrixRMaj m, int row, double factor) {
    for (int j = 0; j < m.numCols; j++) {
      m.set(row, j, m.get(row, j) * factor);
    }
  }
}
