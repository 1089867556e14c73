package loadmark.judge;

import java.util.function.DoubleFunction;
import loadmark.response.Ohms;
import org.apache.commons.math3.complex.Complex;

/**
 * A parallel or series R, L, C: Z = R/(1 + jQδ) or R·(1 + jQδ), δ = f/f0 − f0/f (Terman, Radio
 * Engineers' Handbook, 1943, section 3, resonant circuits).
 *
 * @param ohm |Z| at resonance
 */
record Resonator(double ohm, double hz, double q) {
  DoubleFunction<Ohms> parallel() {
    return f -> Formula.ohms(new Complex(ohm).divide(detuning(f)));
  }

  DoubleFunction<Ohms> series() {
    return f -> Formula.ohms(detuning(f).multiply(ohm));
  }

  /** (f − f0)·(f + f0) keeps its digits near f0. */
  private Complex detuning(double f) {
    return new Complex(1, q * ((f - hz) * (f + hz) / (f * hz)));
  }

  /** Where |1 + jQδ| = ratio, below (sign −1) or above (+1) resonance: δ = ±√(ratio² − 1)/Q. */
  double edge(double ratio, int sign) {
    double half = sign * Math.sqrt((ratio - 1) * (ratio + 1)) / q / 2;
    return hz * (Math.sqrt(1 + half * half) + half);
  }
}
