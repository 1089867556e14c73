package loadmark.judge;

import org.apache.commons.math3.analysis.solvers.AllowedSolution;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/** The frequency between two samples where an excess changes its sign. */
final class Edge {
  private static final double PRECISION = 1e-13;
  private static final double VALUE_PRECISION = 1e-16;
  private static final int ORDER = 5;
  private static final int MOST_EVALUATIONS = 300;

  private Edge() {}

  /**
   * In hertz, between {@code one} and {@code other}, of which exactly one is past the bound. Where
   * nothing is known counts as kept, so that an edge never claims more than was found; a jump is an
   * edge too.
   */
  static double between(Gauge gauge, Sample one, Sample other) {
    Sample low = one.hz() < other.hz() ? one : other;
    Sample high = one.hz() < other.hz() ? other : one;
    if (low.level() == 0 || high.level() == 0 || low.level() > 0 == high.level() > 0) {
      // One of them stands on the bound, as near as rounding lets it.
      return Math.abs(low.level()) < Math.abs(high.level()) ? low.hz() : high.hz();
    }
    double span = Math.log(high.hz() / low.hz());
    if (span <= PRECISION) {
      return low.hz();
    }
    double x =
        new BracketingNthOrderBrentSolver(PRECISION, PRECISION, VALUE_PRECISION, ORDER)
            .solve(
                MOST_EVALUATIONS,
                at -> level(gauge, low, high, span, at),
                0,
                span,
                AllowedSolution.ANY_SIDE);
    return hz(low, high, x);
  }

  private static double level(Gauge gauge, Sample low, Sample high, double span, double x) {
    if (x <= 0) {
      return low.level();
    }
    return x >= span ? high.level() : gauge.at(hz(low, high, x)).level();
  }

  private static double hz(Sample low, Sample high, double x) {
    return Extremum.clamp(low.hz() * Math.exp(x), low.hz(), high.hz());
  }
}
