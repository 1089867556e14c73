package loadmark.evidence;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The scope of an expectation gone through point by point on its closed form.
 *
 * @param bands how many stretches are broken
 */
record Scan(double worstHz, double worstStrain, double worstValue, int bands) {
  private static final int POINTS = 20_000;

  static Scan of(Expectation expected) {
    boolean isBand = expected.toHz() > expected.fromHz() && expected.fromHz() > 0;
    int points = isBand ? POINTS : 2;
    double best = expected.fromHz();
    double most = Double.NEGATIVE_INFINITY;
    int at = 0;
    int bands = 0;
    boolean broken = false;
    for (int i = 0; i < points; i++) {
      double hz = hz(expected, i, points);
      double strain = expected.strain(hz);
      if (strain > most) {
        most = strain;
        best = hz;
        at = i;
      }
      bands += strain > 1 && !broken ? 1 : 0;
      broken = strain > 1;
    }
    if (isBand && at > 0 && at < points - 1) {
      best = refine(expected, hz(expected, at - 1, points), hz(expected, at + 1, points), best);
    }
    return new Scan(best, expected.strain(best), expected.value(best), bands);
  }

  private static double hz(Expectation expected, int i, int points) {
    if (i == 0) {
      return expected.fromHz();
    }
    if (i == points - 1) {
      return expected.toHz();
    }
    return expected.fromHz()
        * Math.pow(expected.toHz() / expected.fromHz(), i / (double) (points - 1));
  }

  private static double refine(Expectation expected, double from, double to, double start) {
    // A flat top: its place is right to the root of the rounding, its height to the rounding.
    return new BrentOptimizer(1e-10, 1e-300)
        .optimize(
            new UnivariateObjectiveFunction(expected::strain),
            GoalType.MAXIMIZE,
            new SearchInterval(from, to, start),
            new MaxEval(500))
        .getPoint();
  }
}
