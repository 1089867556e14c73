package loadmark.evidence;

import org.apache.commons.math3.complex.Complex;

/** Impedances by the rules of series and parallel, Ω, at a frequency in Hz. */
final class ClosedForm {

  private ClosedForm() {}

  static Complex r(double ohm) {
    return new Complex(ohm);
  }

  static Complex l(double hz, double henry) {
    return new Complex(0, 2 * Math.PI * hz * henry);
  }

  static Complex c(double hz, double farad) {
    return new Complex(0, -1 / (2 * Math.PI * hz * farad));
  }

  static Complex series(Complex... impedances) {
    Complex sum = Complex.ZERO;
    for (Complex z : impedances) {
      sum = sum.add(z);
    }
    return sum;
  }

  static Complex parallel(Complex... impedances) {
    Complex sum = Complex.ZERO;
    for (Complex z : impedances) {
      sum = sum.add(z.reciprocal());
    }
    return sum.reciprocal();
  }

  static double degrees(Complex z) {
    return Math.toDegrees(z.getArgument());
  }

  /** |with/without − 1|. */
  static double change(Complex with, Complex without) {
    return with.subtract(without).abs() / without.abs();
  }

  /** 20·log10 |(z + r)/(z − r)|, dB. */
  static double returnLoss(Complex z, Complex reference) {
    return 20 * Math.log10(z.add(reference).abs() / z.subtract(reference).abs());
  }

  /** |a − b|/|b|. */
  static double apart(Complex a, Complex b) {
    return a.subtract(b).abs() / b.abs();
  }
}
