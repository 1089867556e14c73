package loadmark.solve;

/**
 * A real number of about 32 digits: the unevaluated sum of two doubles, the second at most half a
 * unit in the last place of the first (Dekker, A floating-point technique for extending the
 * available precision, 1971; Joldes, Muller, Popescu, Tight and rigorous error bounds for basic
 * building blocks of double-word arithmetic, 2017). Errors of the operations are below 2⁻¹⁰².
 */
record DoubleDouble(double hi, double lo) {
  static final DoubleDouble ZERO = new DoubleDouble(0, 0);

  static DoubleDouble of(double value) {
    return new DoubleDouble(value, 0);
  }

  /** a + b, without error. */
  static DoubleDouble sum(double a, double b) {
    double sum = a + b;
    double part = sum - a;
    return new DoubleDouble(sum, (a - (sum - part)) + (b - part));
  }

  private static DoubleDouble normal(double hi, double lo) {
    double sum = hi + lo;
    return new DoubleDouble(sum, lo - (sum - hi));
  }

  DoubleDouble plus(DoubleDouble other) {
    DoubleDouble high = sum(hi, other.hi);
    DoubleDouble low = sum(lo, other.lo);
    DoubleDouble once = normal(high.hi, high.lo + low.hi);
    return normal(once.hi, once.lo + low.lo);
  }

  DoubleDouble minus(DoubleDouble other) {
    return plus(other.negate());
  }

  DoubleDouble times(DoubleDouble other) {
    double product = hi * other.hi;
    double rest = Math.fma(hi, other.hi, -product);
    return normal(product, rest + Math.fma(hi, other.lo, lo * other.hi));
  }

  DoubleDouble over(DoubleDouble other) {
    double first = hi / other.hi;
    DoubleDouble left = minus(other.times(of(first)));
    double second = left.hi / other.hi;
    DoubleDouble rest = left.minus(other.times(of(second)));
    double third = rest.hi / other.hi;
    DoubleDouble sum = normal(first, second);
    return normal(sum.hi, sum.lo + third);
  }

  DoubleDouble negate() {
    return new DoubleDouble(-hi, -lo);
  }
}
