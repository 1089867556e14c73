package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Band;

/**
 * Makes sure of the worst point of a band: the level starts at the worst point known and is raised
 * to the worst one between its crossings until there are none (Bruinsma and Steinbuch, A Fast
 * Algorithm to Compute the H∞-Norm of a Transfer Function Matrix, Systems and Control Letters 14,
 * 1990).
 */
final class WorstRaising {
  private static final int MOST_LEVELS = 30;

  /** Higher by this many times the estimated error is no rounding. */
  private static final double BEYOND_ERROR = 4;

  /** Of an excess near 0: what rounding leaves. */
  private static final double ROUNDING = 1e-15;

  private WorstRaising() {}

  /**
   * The worst point.
   *
   * @param start the worst point known; an excess of −∞ there is that of all points, and since the
   *     criterion is algebraic it is then nowhere larger
   * @return empty where the algebra failed, or found no end
   */
  static Optional<Sample> raise(Gauge gauge, Algebra algebra, Band band, Sample start) {
    Sample best = start;
    for (int i = 0; i < MOST_LEVELS; i++) {
      if (!(best.reading() instanceof Reading.Known known) || Double.isInfinite(known.excess())) {
        return Optional.of(best);
      }
      double level = known.excess() + step(gauge.measure(), known);
      Optional<double[]> candidates = algebra.candidates(gauge.measure(), level, band, 1);
      if (candidates.isEmpty()) {
        return Optional.empty();
      }
      List<Sample> samples = gauge.at(Surroundings.of(candidates.get(), band));
      Optional<Sample> top = Peak.of(gauge, samples, 0, samples.size() - 1);
      if (top.isEmpty() || top.get().excess() <= level) {
        return Optional.of(best);
      }
      best = top.get();
    }
    return Optional.empty();
  }

  private static double step(Measure measure, Reading.Known known) {
    double error = BEYOND_ERROR * Math.min(known.spread().up(), 1);
    return Math.max(ROUNDING, Math.max(measure.grain(known), error));
  }
}
