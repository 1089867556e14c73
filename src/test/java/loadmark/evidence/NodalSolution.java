package loadmark.evidence;

import java.util.List;
import org.apache.commons.math3.complex.Complex;

/**
 * Nodal analysis with a dense matrix and partial pivoting, of its own: node 0 is common, a current
 * of 1 A enters at one node and leaves at another.
 */
final class NodalSolution {

  /** An admittance (S) between two nodes. */
  record Branch(int from, int to, Complex siemens) {}

  private final List<Branch> branches;
  private final Complex[] volts;
  private final int in;
  private final int out;

  /**
   * @param nodes how many there are beside the common one
   */
  NodalSolution(int nodes, List<Branch> branches, int in, int out) {
    this.branches = branches;
    this.in = in;
    this.out = out;
    Complex[][] a = new Complex[nodes + 1][nodes + 2];
    for (Complex[] row : a) {
      java.util.Arrays.fill(row, Complex.ZERO);
    }
    for (Branch b : branches) {
      a[b.from][b.from] = a[b.from][b.from].add(b.siemens);
      a[b.to][b.to] = a[b.to][b.to].add(b.siemens);
      a[b.from][b.to] = a[b.from][b.to].subtract(b.siemens);
      a[b.to][b.from] = a[b.to][b.from].subtract(b.siemens);
    }
    a[in][nodes + 1] = a[in][nodes + 1].add(Complex.ONE);
    a[out][nodes + 1] = a[out][nodes + 1].subtract(Complex.ONE);
    volts = solve(a, nodes);
  }

  /** Gauss with partial pivoting on rows and columns 1…n; column n + 1 is the right side. */
  private static Complex[] solve(Complex[][] a, int n) {
    for (int k = 1; k <= n; k++) {
      int pivot = k;
      for (int i = k + 1; i <= n; i++) {
        if (a[i][k].abs() > a[pivot][k].abs()) {
          pivot = i;
        }
      }
      Complex[] swapped = a[k];
      a[k] = a[pivot];
      a[pivot] = swapped;
      for (int i = k + 1; i <= n; i++) {
        Complex factor = a[i][k].divide(a[k][k]);
        for (int j = k; j <= n + 1; j++) {
          a[i][j] = a[i][j].subtract(factor.multiply(a[k][j]));
        }
      }
    }
    Complex[] x = new Complex[n + 1];
    x[0] = Complex.ZERO;
    for (int k = n; k >= 1; k--) {
      Complex sum = a[k][n + 1];
      for (int j = k + 1; j <= n; j++) {
        sum = sum.subtract(a[k][j].multiply(x[j]));
      }
      x[k] = sum.divide(a[k][k]);
    }
    return x;
  }

  /** V, from one node to another. */
  Complex volts(int plus, int minus) {
    return volts[plus].subtract(volts[minus]);
  }

  /** Ω, between the nodes of the current. */
  Complex impedance() {
    return volts(in, out);
  }

  /**
   * How much a relative error of every element moves Z, relative: Σ|y ∂Z/∂y|/|Z| with ∂Z/∂y = −v²,
   * v the voltage across the element at 1 A (Tellegen; Director and Rohrer, The Generalized Adjoint
   * Network and Network Sensitivities, IEEE Trans. Circuit Theory 16, 1969).
   */
  double condition() {
    double sum = 0;
    for (Branch b : branches) {
      double v = volts(b.from, b.to).abs();
      sum += b.siemens.abs() * v * v;
    }
    return sum / impedance().abs();
  }
}
