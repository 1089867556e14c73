package loadmark.touchstone;

/**
 * A complex number.
 *
 * @param re real part, finite
 * @param im imaginary part, finite
 */
public record Complex(double re, double im) {
  public static final Complex ZERO = new Complex(0, 0);
  public static final Complex ONE = new Complex(1, 0);

  public boolean isZero() {
    return re == 0 && im == 0;
  }

  boolean isFinite() {
    return Double.isFinite(re) && Double.isFinite(im);
  }

  double magnitude() {
    return Math.hypot(re, im);
  }

  Complex plus(Complex other) {
    return new Complex(re + other.re, im + other.im);
  }

  Complex minus(Complex other) {
    return new Complex(re - other.re, im - other.im);
  }

  Complex times(double factor) {
    return new Complex(re * factor, im * factor);
  }

  Complex times(Complex other) {
    return new Complex(re * other.re - im * other.im, re * other.im + im * other.re);
  }

  /** Without overflow on the way (R. L. Smith, Algorithm 116, Comm. ACM 5, 1962). */
  Complex dividedBy(Complex other) {
    if (Math.abs(other.re) >= Math.abs(other.im)) {
      double ratio = other.im / other.re;
      double divisor = other.re + other.im * ratio;
      return new Complex((re + im * ratio) / divisor, (im - re * ratio) / divisor);
    }
    double ratio = other.re / other.im;
    double divisor = other.re * ratio + other.im;
    return new Complex((re * ratio + im) / divisor, (im * ratio - re) / divisor);
  }
}
