package loadmark.judge;

import loadmark.response.Change;
import loadmark.response.Loading;

/**
 * | |Z_with| − |Z_without| | / |Z_without| at most {@code most}: | |1 + h| − 1 | of the change h,
 * without a difference of near equals.
 */
record MagnitudeChange(double most) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Change h = loading.change();
    if (h.isUndetermined()) {
      return Unknowns.ofChange(loading);
    }
    return Excess.atMost(h.isUnbounded() ? Double.POSITIVE_INFINITY : magnitude(h), most);
  }

  /** |2·Re h + |h|²| / (|1 + h| + 1). */
  private static double magnitude(Change h) {
    double size = h.magnitude();
    if (size == 0) {
      return 0;
    }
    double share = size / (Math.hypot(1 + h.re(), h.im()) + 1);
    return Math.abs(2 * h.re() / size + size) * share;
  }
}
