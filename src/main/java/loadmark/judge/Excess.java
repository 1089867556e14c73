package loadmark.judge;

import java.util.OptionalDouble;

/**
 * Distances past a bound, as natural logarithms of ratios, so that they keep small values apart.
 */
final class Excess {
  /** A value past its bound by this share of it is still kept. */
  static final double SLACK = 1e-9;

  /** The excess of a value that is as far past its bound as is still kept. */
  private static final double KEPT = Math.log1p(SLACK);

  private Excess() {}

  /**
   * A value of 0 or more, possibly infinite, against the most it may be.
   *
   * @param error relative, of the value
   */
  static Reading.Known atMost(double value, double most, double error) {
    double excess = logRatio(value, most);
    return value == Double.POSITIVE_INFINITY
        ? Reading.unbounded(excess)
        : Reading.of(value, excess, KEPT, Spread.ofLogarithm(error));
  }

  /**
   * A value of 0 or more, possibly infinite, in a window: the larger of ln(value/to) and
   * ln(from/value).
   *
   * @param spread of ln(value)
   */
  static Reading.Known within(double value, OptionalDouble from, OptionalDouble to, Spread spread) {
    double over = to.isPresent() ? logRatio(value, to.getAsDouble()) : Double.NEGATIVE_INFINITY;
    double under =
        from.isPresent() ? logRatio(from.getAsDouble(), value) : Double.NEGATIVE_INFINITY;
    double excess = Math.max(over, under);
    if (value == Double.POSITIVE_INFINITY) {
      return Reading.unbounded(excess);
    }
    Spread either =
        to.isEmpty() ? spread.turned() : from.isEmpty() ? spread : spread.or(spread.turned());
    return Reading.of(value, excess, KEPT, either);
  }

  /** ln(a/b) for a, b of 0 or more; 0 where they are one, infinite where one alone is 0 or ∞. */
  static double logRatio(double a, double b) {
    if (a == b) {
      return 0;
    }
    double ratio = a / b;
    if (ratio > 0.5 && ratio < 2) {
      return Math.log1p((a - b) / b);
    }
    return Math.log(a) - Math.log(b);
  }
}
