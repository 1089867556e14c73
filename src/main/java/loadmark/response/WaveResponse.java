package loadmark.response;

import org.apache.commons.math3.complex.Complex;
import org.ejml.data.ZMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_ZDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/** A system of one input and one output in ζ = (s + s0)/(s − s0), at any complex frequency. */
final class WaveResponse {
  private final StateSpace system;
  private final double s0;

  WaveResponse(StateSpace system, double s0) {
    this.system = system;
    this.s0 = s0;
  }

  /** Its value at {@code s}, rad/s; not finite at a pole. */
  Complex at(Complex s) {
    int n = system.states();
    Complex zeta = s.add(s0).divide(s.subtract(s0));
    ZMatrixRMaj left = new ZMatrixRMaj(n, n);
    ZMatrixRMaj right = new ZMatrixRMaj(n, 1);
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        left.set(i, j, -system.a().get(i, j), 0);
      }
      left.set(i, i, zeta.getReal() + left.getReal(i, i), zeta.getImaginary());
      right.set(i, 0, system.b().get(i, 0), 0);
    }
    Complex sum = new Complex(system.d().get(0, 0));
    if (n == 0) {
      return sum;
    }
    ZMatrixRMaj states = new ZMatrixRMaj(n, 1);
    LinearSolverDense<ZMatrixRMaj> solver = LinearSolverFactory_ZDRM.lu(n);
    if (!solver.setA(left)) {
      return Complex.INF;
    }
    solver.solve(right, states);
    for (int i = 0; i < n; i++) {
      Complex state = new Complex(states.getReal(i, 0), states.getImag(i, 0));
      sum = sum.add(state.multiply(system.c().get(0, i)));
    }
    return sum;
  }
}
