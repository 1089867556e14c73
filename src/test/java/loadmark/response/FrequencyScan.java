package loadmark.response;

import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.decomposition.hessenberg.HessenbergSimilarDecomposition_DDRM;

/** A system of one input and one output at many frequencies, quick: A is brought to Hessenberg. */
final class FrequencyScan {
  private final int n;
  private final double s0;
  private final double[] h;
  private final double[] b;
  private final double[] c;
  private final double d;

  FrequencyScan(StateSpace system, double s0) {
    this.s0 = s0;
    n = system.states();
    d = system.d().get(0, 0);
    if (n == 0) {
      h = new double[0];
      b = new double[0];
      c = new double[0];
      return;
    }
    HessenbergSimilarDecomposition_DDRM hessenberg = new HessenbergSimilarDecomposition_DDRM(n);
    StateSpace balanced = Balance.of(system);
    hessenberg.decompose(balanced.a().copy());
    DMatrixRMaj q = hessenberg.getQ(null);
    h = hessenberg.getH(null).data;
    DMatrixRMaj qb = new DMatrixRMaj(n, 1);
    DMatrixRMaj cq = new DMatrixRMaj(1, n);
    CommonOps_DDRM.multTransA(q, balanced.b(), qb);
    CommonOps_DDRM.mult(balanced.c(), q, cq);
    b = qb.data;
    c = cq.data;
  }

  Complex at(double hz) {
    return atS(new Complex(0, 2 * Math.PI * hz));
  }

  Complex atS(Complex s) {
    Complex zeta = s.add(s0).divide(s.subtract(s0));
    double[] re = new double[n * n];
    double[] im = new double[n * n];
    double[] xr = b.clone();
    double[] xi = new double[n];
    for (int i = 0; i < n * n; i++) {
      re[i] = -h[i];
    }
    for (int i = 0; i < n; i++) {
      re[i * n + i] += zeta.getReal();
      im[i * n + i] += zeta.getImaginary();
    }
    for (int k = 0; k + 1 < n; k++) {
      int p = k * n;
      int r = p + n;
      if (Math.hypot(re[r + k], im[r + k]) > Math.hypot(re[p + k], im[p + k])) {
        for (int j = k; j < n; j++) {
          swap(re, p + j, r + j);
          swap(im, p + j, r + j);
        }
        swap(xr, k, k + 1);
        swap(xi, k, k + 1);
      }
      double square = re[p + k] * re[p + k] + im[p + k] * im[p + k];
      double fr = (re[r + k] * re[p + k] + im[r + k] * im[p + k]) / square;
      double fi = (im[r + k] * re[p + k] - re[r + k] * im[p + k]) / square;
      for (int j = k; j < n; j++) {
        double tr = re[p + j];
        double ti = im[p + j];
        re[r + j] -= fr * tr - fi * ti;
        im[r + j] -= fr * ti + fi * tr;
      }
      double tr = xr[k];
      double ti = xi[k];
      xr[k + 1] -= fr * tr - fi * ti;
      xi[k + 1] -= fr * ti + fi * tr;
    }
    double yr = d;
    double yi = 0;
    for (int k = n - 1; k >= 0; k--) {
      double sr = xr[k];
      double si = xi[k];
      for (int j = k + 1; j < n; j++) {
        sr -= re[k * n + j] * xr[j] - im[k * n + j] * xi[j];
        si -= re[k * n + j] * xi[j] + im[k * n + j] * xr[j];
      }
      double pr = re[k * n + k];
      double pi = im[k * n + k];
      double square = pr * pr + pi * pi;
      xr[k] = (sr * pr + si * pi) / square;
      xi[k] = (si * pr - sr * pi) / square;
      yr += c[k] * xr[k];
      yi += c[k] * xi[k];
    }
    return new Complex(yr, yi);
  }

  private static void swap(double[] x, int i, int j) {
    double kept = x[i];
    x[i] = x[j];
    x[j] = kept;
  }
}
