package loadmark;

import org.ejml.data.ZMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_ZDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/** The same ladder by EJML's complex LU of the nodal matrix, bare and loaded. */
final class DenseLadder {
  private final Ladder ladder;
  private final ZMatrixRMaj matrix;
  private final ZMatrixRMaj drive;
  private final ZMatrixRMaj volts;
  private final LinearSolverDense<ZMatrixRMaj> lu;

  DenseLadder(Ladder ladder) {
    this.ladder = ladder;
    int n = ladder.nodes();
    matrix = new ZMatrixRMaj(n, n);
    drive = new ZMatrixRMaj(n, 1);
    volts = new ZMatrixRMaj(n, 1);
    drive.set(0, 0, 1, 0);
    lu = LinearSolverFactory_ZDRM.lu(n);
  }

  /** Z bare and Z loaded, re and im in turn. */
  double[] solve(double[] hz) {
    double[] found = new double[4 * hz.length];
    for (int i = 0; i < hz.length; i++) {
      for (int loaded = 0; loaded < 2; loaded++) {
        assemble(2 * Math.PI * hz[i], loaded == 1);
        if (!lu.setA(matrix)) {
          throw new IllegalStateException("singular at " + hz[i] + " Hz");
        }
        lu.solve(drive, volts);
        found[4 * i + 2 * loaded] = volts.getReal(0, 0);
        found[4 * i + 2 * loaded + 1] = volts.getImag(0, 0);
      }
    }
    return found;
  }

  private void assemble(double omega, boolean loaded) {
    matrix.zero();
    int n = ladder.nodes();
    for (int i = 1; i <= n; i++) {
      if (i < n && ladder.isResistor(i)) {
        addArm(i - 1, 1 / ladder.seriesOhm(i), 0);
      } else if (i < n) {
        addArm(i - 1, 0, -1 / (omega * ladder.seriesHenry(i)));
      }
      double re = ladder.hasShuntResistor(i) ? 1 / ladder.shuntOhm(i) : 0;
      add(i - 1, i - 1, re, omega * ladder.shuntFarad(i));
    }
    add(n - 1, n - 1, 1 / Ladder.END_OHM, 0);
    if (loaded) {
      add(n - 1, n - 1, 1 / Ladder.LOAD_OHM, omega * Ladder.LOAD_FARAD);
    }
  }

  private void addArm(int i, double re, double im) {
    add(i, i, re, im);
    add(i + 1, i + 1, re, im);
    add(i, i + 1, -re, -im);
    add(i + 1, i, -re, -im);
  }

  private void add(int i, int j, double re, double im) {
    int at = 2 * (i * matrix.numCols + j);
    matrix.data[at] += re;
    matrix.data[at + 1] += im;
  }
}
