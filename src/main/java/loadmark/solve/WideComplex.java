package loadmark.solve;

/** A complex number of about 32 digits. */
record WideComplex(DoubleDouble re, DoubleDouble im) {
  static final WideComplex ZERO = new WideComplex(DoubleDouble.ZERO, DoubleDouble.ZERO);
  static final WideComplex ONE = real(1);

  static WideComplex real(double value) {
    return new WideComplex(DoubleDouble.of(value), DoubleDouble.ZERO);
  }

  static WideComplex of(double re, double im) {
    return new WideComplex(DoubleDouble.of(re), DoubleDouble.of(im));
  }

  WideComplex plus(WideComplex other) {
    return new WideComplex(re.plus(other.re), im.plus(other.im));
  }

  WideComplex minus(WideComplex other) {
    return new WideComplex(re.minus(other.re), im.minus(other.im));
  }

  WideComplex times(WideComplex other) {
    return new WideComplex(
        re.times(other.re).minus(im.times(other.im)), re.times(other.im).plus(im.times(other.re)));
  }

  WideComplex times(DoubleDouble by) {
    return new WideComplex(re.times(by), im.times(by));
  }

  WideComplex over(WideComplex other) {
    return times(other.inverse());
  }

  /** 1/this; not a number where this is 0. */
  WideComplex inverse() {
    DoubleDouble square = re.times(re).plus(im.times(im));
    return new WideComplex(re.over(square), im.negate().over(square));
  }

  WideComplex negate() {
    return new WideComplex(re.negate(), im.negate());
  }

  /** |re| + |im|. */
  double size() {
    return Math.abs(re.hi()) + Math.abs(im.hi());
  }

  boolean isZero() {
    return re.hi() == 0 && im.hi() == 0;
  }
}
