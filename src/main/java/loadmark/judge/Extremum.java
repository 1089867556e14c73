package loadmark.judge;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The turning point of an excess near a sample (Brent, Algorithms for Minimization, 1973, ch. 5).
 */
final class Extremum {
  /** Relative, of the frequency: fine enough that even a kink's value is right to 1e-9. */
  private static final double PRECISION = 1e-12;

  private static final int MOST_EVALUATIONS = 400;

  /** Stands for an infinite excess, past what logarithms of doubles reach. */
  private static final double FAR = 1e4;

  private Extremum() {}

  /** The highest sample seen between two frequencies, starting at {@code here} or beside it. */
  static Sample highest(Gauge gauge, double lowHz, Sample here, double highHz) {
    return Pole.check(gauge, search(gauge, lowHz, here, highHz, 1));
  }

  /** The lowest sample seen. */
  static Sample lowest(Gauge gauge, double lowHz, Sample here, double highHz) {
    return search(gauge, lowHz, here, highHz, -1);
  }

  private static Sample search(Gauge gauge, double lowHz, Sample here, double highHz, double sign) {
    double origin = here.hz();
    double low = Math.log(lowHz / origin);
    double high = Math.log(highHz / origin);
    if (!(low < high)) {
      return here;
    }
    Best best = new Best(here, sign);
    double start = low < 0 && high > 0 ? 0 : (low + high) / 2;
    new BrentOptimizer(PRECISION, PRECISION)
        .optimize(
            new MaxEval(MOST_EVALUATIONS),
            GoalType.MAXIMIZE,
            new SearchInterval(low, high, start),
            new UnivariateObjectiveFunction(
                x -> best.offer(gauge.at(clamp(origin * Math.exp(x), lowHz, highHz)))));
    return best.sample;
  }

  static double clamp(double hz, double lowHz, double highHz) {
    return Math.min(Math.max(hz, lowHz), highHz);
  }

  /** The best sample so far. */
  private static final class Best {
    private final double sign;
    private Sample sample;

    Best(Sample sample, double sign) {
      this.sample = sample;
      this.sign = sign;
    }

    double offer(Sample next) {
      double height = height(next);
      if (height > height(sample)) {
        sample = next;
      }
      return height;
    }

    private double height(Sample one) {
      return clamp(sign * one.excess(), -FAR, FAR);
    }
  }
}
