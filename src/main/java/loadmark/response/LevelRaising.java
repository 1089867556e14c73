package loadmark.response;

import java.util.Arrays;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import loadmark.network.Band;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;

/**
 * The largest value of a criterion in a band, certain because no higher level is crossed: the level
 * starts at the best value known and is raised to the best between its crossings until there are
 * none (Bruinsma and Steinbuch, A Fast Algorithm to Compute the H∞-Norm of a Transfer Function
 * Matrix, Systems and Control Letters 14, 1990).
 */
public final class LevelRaising {
  /** A level this much higher, relative, that is nowhere reached makes the best one the worst. */
  private static final double RAISE = 1e-10;

  private static final int MOST_LEVELS = 40;
  private static final int MOST_EVALUATIONS = 100;
  private static final double RELATIVE_TOLERANCE = 1e-9;
  private static final double LOG_TOLERANCE = 1e-12;

  /**
   * What was found.
   *
   * @param hz the lowest frequency where it was found
   * @param certain whether no higher level is reached; else only nothing higher was seen
   */
  public record Top(double hz, double value, boolean certain) {}

  private final DoubleUnaryOperator value;
  private final DoubleFunction<double[]> candidates;
  private final Band band;
  private Top best;

  private LevelRaising(DoubleUnaryOperator value, DoubleFunction<double[]> candidates, Band band) {
    this.value = value;
    this.candidates = candidates;
    this.band = band;
    best = new Top(band.fromHz(), value.applyAsDouble(band.fromHz()), false);
  }

  /**
   * The largest value.
   *
   * @param value positive, of a frequency in Hz, continuous; +∞ ends the search
   * @param candidates the frequencies where it may have a level, ascending, as {@link
   *     Crossings#candidates} gives them
   * @param starts Hz, ascending, inside the band: where to look first
   */
  public static Top raise(
      DoubleUnaryOperator value, DoubleFunction<double[]> candidates, Band band, double[] starts) {
    LevelRaising raising = new LevelRaising(value, candidates, band);
    raising.look(starts);
    return raising.raise();
  }

  private Top raise() {
    for (int i = 0; i < MOST_LEVELS && Double.isFinite(best.value); i++) {
      double level = best.value * (1 + RAISE);
      look(candidates.apply(level));
      if (best.value <= level) {
        return new Top(best.hz, best.value, true);
      }
    }
    return new Top(best.hz, best.value, Double.isInfinite(best.value));
  }

  /** Looks at points, between them and at the band's ends, and climbs from the best of all. */
  private void look(double[] points) {
    double[] all =
        DoubleStream.concat(Arrays.stream(points), DoubleStream.of(band.fromHz(), band.toHz()))
            .sorted()
            .distinct()
            .toArray();
    double[] tried = new double[2 * all.length - 1];
    int top = -1;
    double most = best.value;
    for (int i = 0; i < tried.length; i++) {
      tried[i] = i % 2 == 0 ? all[i / 2] : Math.sqrt(all[i / 2] * all[i / 2 + 1]);
      double now = value.applyAsDouble(tried[i]);
      if (now > most) {
        most = now;
        top = i;
      }
    }
    if (top >= 0) {
      best = new Top(tried[top], most, false);
      climb(tried[Math.max(top - 1, 0)], tried[Math.min(top + 1, tried.length - 1)]);
    }
  }

  /** The top between two neighbours of the best point. */
  private void climb(double from, double to) {
    if (!(from < best.hz && best.hz < to) || Double.isInfinite(best.value)) {
      return;
    }
    double middle = best.hz;
    UnivariatePointValuePair found =
        new BrentOptimizer(RELATIVE_TOLERANCE, LOG_TOLERANCE)
            .optimize(
                new MaxEval(MOST_EVALUATIONS),
                GoalType.MAXIMIZE,
                new SearchInterval(Math.log(from / middle), Math.log(to / middle), 0),
                new UnivariateObjectiveFunction(x -> value.applyAsDouble(middle * Math.exp(x))));
    if (found.getValue() > best.value) {
      best = new Top(middle * Math.exp(found.getPoint()), found.getValue(), false);
    }
  }
}
