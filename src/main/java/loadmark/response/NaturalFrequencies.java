package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import loadmark.equation.Circuit;
import loadmark.equation.Rates;
import org.apache.commons.math3.complex.Complex;

/** The natural frequencies (rad/s) of a circuit with its sources at rest. */
final class NaturalFrequencies {
  /** Shifts a decade apart know best the eigenvalues within a factor of 3 of themselves. */
  private static final double STEP = 10;

  /** How far beyond its border a shift claims. */
  private static final double OVERLAP = 1.001;

  /** Two shifts that claim the same one at their border differ by less than this, relative. */
  private static final double SAME = 1e-5;

  private NaturalFrequencies() {}

  /**
   * All of a range of |s| with their multiplicity, each from the shift next to it.
   *
   * @throws ArithmeticException where eigenvalues did not come out
   */
  static List<Complex> of(Circuit circuit, Rates range) {
    List<Complex> found = new ArrayList<>();
    if (circuit.reactive() == 0) {
      return found;
    }
    double half = Math.sqrt(STEP);
    for (double s0 = range.slowest(); s0 < range.fastest() * STEP; s0 *= STEP) {
      List<Complex> before = List.copyOf(found);
      for (Complex zeta : Eigenvalues.of(WaveRealisation.of(circuit, s0).a())) {
        Complex s = zeta.add(1).divide(zeta.subtract(1)).multiply(s0);
        double ratio = s.abs() / s0;
        boolean mine = 1 / half <= ratio * OVERLAP && ratio < half * OVERLAP;
        boolean border = ratio * half < OVERLAP * OVERLAP;
        if (mine && !(border && before.stream().anyMatch(b -> distance(b, s) < SAME))) {
          found.add(s);
        }
      }
    }
    return found;
  }

  /** How far apart, in parts of the second. */
  static double distance(Complex a, Complex b) {
    return a.subtract(b).abs() / b.abs();
  }
}
