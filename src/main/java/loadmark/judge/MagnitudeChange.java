package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.response.Change;
import loadmark.response.Level;
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
    if (h.isUnbounded()) {
      return Excess.atMost(Double.POSITIVE_INFINITY, most, 0);
    }
    double value = magnitude(h);
    double error = value > 0 ? loading.changeError() * (h.magnitude() / value) : 0;
    return Excess.atMost(value, most, error);
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

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofMost(Criterion.MAGNITUDE_CHANGE, Optional.empty(), most, excess);
  }
}
