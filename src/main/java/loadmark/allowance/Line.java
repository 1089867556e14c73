package loadmark.allowance;

import org.apache.commons.math3.complex.Complex;

/** A complex number that grows evenly: at0 + slope·t, t real. */
record Line(Complex at0, Complex slope) {
  static final Line ONE = new Line(Complex.ONE, Complex.ZERO);

  static Line of(Complex constant) {
    return new Line(constant, Complex.ZERO);
  }

  Line times(Complex factor) {
    return new Line(at0.multiply(factor), slope.multiply(factor));
  }

  Line plus(Line other) {
    return new Line(at0.add(other.at0), slope.add(other.slope));
  }

  /** |this|². */
  Quadratic square() {
    return new Quadratic(square(at0), 2 * inner(at0, slope), square(slope));
  }

  /** Re(this·other*·direction). */
  Quadratic real(Line other, Complex direction) {
    Complex a = at0.multiply(direction);
    Complex b = slope.multiply(direction);
    return new Quadratic(
        inner(a, other.at0), inner(a, other.slope) + inner(b, other.at0), inner(b, other.slope));
  }

  /** Re(a·b*). */
  private static double inner(Complex a, Complex b) {
    return a.getReal() * b.getReal() + a.getImaginary() * b.getImaginary();
  }

  private static double square(Complex a) {
    return inner(a, a);
  }
}
