package loadmark.allowance;

import java.util.stream.DoubleStream;

/** c0 + c1·t + c2·t². */
record Quadratic(double c0, double c1, double c2) {
  Quadratic times(double factor) {
    return new Quadratic(c0 * factor, c1 * factor, c2 * factor);
  }

  Quadratic plus(Quadratic other) {
    return new Quadratic(c0 + other.c0, c1 + other.c1, c2 + other.c2);
  }

  Quadratic minus(Quadratic other) {
    return plus(other.times(-1));
  }

  double at(double t) {
    return c0 + t * (c1 + t * c2);
  }

  /**
   * Its positive roots, in any order, by the form that does not cancel (Press and others, Numerical
   * Recipes, 3rd edition, 2007, section 5.6).
   */
  DoubleStream positiveRoots() {
    double discriminant = c1 * c1 - 4 * c2 * c0;
    if (!(discriminant >= 0)) {
      return DoubleStream.empty();
    }
    double q = -(c1 + Math.copySign(Math.sqrt(discriminant), c1)) / 2;
    return DoubleStream.of(q / c2, c0 / q).filter(t -> t > 0 && t < Double.POSITIVE_INFINITY);
  }
}
