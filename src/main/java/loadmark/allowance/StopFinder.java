package loadmark.allowance;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.SortedSet;
import java.util.TreeSet;
import loadmark.judge.BrokenBand;
import loadmark.network.Band;
import loadmark.network.Limit;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The first t at which a growing load breaks a limit at any of many frequencies. At each of them
 * that is exact; between them the least is looked for (Brent, Algorithms for Minimization, 1973,
 * ch. 5).
 */
final class StopFinder {
  private static final double PER_DECADE = 200;
  private static final int LEAST_INTERVALS = 100;

  /** Into so many parts a band is cut that turned out to be broken. */
  private static final int IN_BAND = 16;

  /** Low points this much above the lowest may still lead lower. */
  private static final double NEAR = 1.1;

  private static final double PRECISION = 1e-12;
  private static final int MOST_EVALUATIONS = 200;

  /** Stands for the logarithm of an infinite t. */
  private static final double FAR = 1e4;

  private final LoadPlace place;
  private final List<Limit> limits;

  /** The place's responses over each limit's scope, band by band. */
  private final List<List<List<LoadPlace.Point>>> grids = new ArrayList<>();

  StopFinder(LoadPlace place, List<Limit> limits) {
    this.place = place;
    this.limits = limits;
    TreeSet<Double> all = new TreeSet<>();
    limits.forEach(l -> l.scope().forEach(band -> addPoints(band, all)));
    double[] hz = all.stream().mapToDouble(Double::doubleValue).toArray();
    List<LoadPlace.Point> points = place.at(hz);
    for (Limit limit : limits) {
      grids.add(limit.scope().stream().map(band -> inside(points, band)).toList());
    }
  }

  private static void addPoints(Band band, SortedSet<Double> all) {
    all.add(band.fromHz());
    all.add(band.toHz());
    if (!band.isPoint()) {
      double decades = Math.log10(band.toHz() / band.fromHz());
      int n = (int) Math.max(LEAST_INTERVALS, Math.ceil(PER_DECADE * decades));
      all.addAll(between(band, n));
    }
  }

  /** The ends of n equal logarithmic steps, but for the first and the last. */
  private static List<Double> between(Band band, int n) {
    List<Double> hz = new ArrayList<>();
    for (int i = 1; i < n; i++) {
      hz.add(band.fromHz() * Math.pow(band.toHz() / band.fromHz(), (double) i / n));
    }
    return hz;
  }

  private static List<LoadPlace.Point> inside(List<LoadPlace.Point> points, Band band) {
    return points.stream().filter(p -> band.fromHz() <= hz(p) && hz(p) <= band.toHz()).toList();
  }

  private static double hz(LoadPlace.Point point) {
    return point.without().hz();
  }

  /** Over all limits and their scopes. */
  Stop find(Growth growth) {
    Stop first = Stop.NOWHERE;
    for (int i = 0; i < limits.size(); i++) {
      for (List<LoadPlace.Point> grid : grids.get(i)) {
        first = first.sooner(least(limits.get(i), growth, grid));
      }
    }
    return first;
  }

  /** Over the bands where a limit turned out to be broken. */
  Stop find(Limit limit, Growth growth, List<BrokenBand> bands) {
    Stop first = Stop.NOWHERE;
    for (BrokenBand broken : bands) {
      TreeSet<Double> hz = new TreeSet<>(between(broken.band(), IN_BAND));
      hz.add(broken.band().fromHz());
      hz.add(broken.worst().hz());
      hz.add(broken.band().toHz());
      List<LoadPlace.Point> points =
          place.at(hz.stream().mapToDouble(Double::doubleValue).toArray());
      first = first.sooner(least(limit, growth, points));
    }
    return first;
  }

  private Stop least(Limit limit, Growth growth, List<LoadPlace.Point> points) {
    double[] t = points.stream().mapToDouble(p -> first(limit, p, growth)).toArray();
    double lowest = Double.POSITIVE_INFINITY;
    for (double one : t) {
      lowest = Math.min(lowest, one);
    }
    double least = lowest;
    for (int i = 0; i < t.length && lowest > 0; i++) {
      double before = i == 0 ? Double.POSITIVE_INFINITY : t[i - 1];
      double after = i == t.length - 1 ? Double.POSITIVE_INFINITY : t[i + 1];
      if (t[i] <= NEAR * lowest && t[i] <= before && t[i] <= after) {
        double low = hz(points.get(Math.max(i - 1, 0)));
        double high = hz(points.get(Math.min(i + 1, t.length - 1)));
        least = Math.min(least, narrow(limit, growth, low, hz(points.get(i)), high));
      }
    }
    return Stop.at(least, limit);
  }

  private static double first(Limit limit, LoadPlace.Point point, Growth growth) {
    OptionalDouble t =
        point.response().isEmpty()
            ? OptionalDouble.empty()
            : Breaches.first(limit, point.response().get(), growth);
    return t.orElse(Double.POSITIVE_INFINITY);
  }

  /** The least t seen between two frequencies. */
  private double narrow(Limit limit, Growth growth, double lowHz, double hz, double highHz) {
    double from = Math.log(lowHz / hz);
    double to = Math.log(highHz / hz);
    if (!(from < to) || hz == 0) {
      return Double.POSITIVE_INFINITY;
    }
    double start = from < 0 && to > 0 ? 0 : (from + to) / 2;
    double logT =
        new BrentOptimizer(PRECISION, PRECISION)
            .optimize(
                new MaxEval(MOST_EVALUATIONS),
                GoalType.MINIMIZE,
                new SearchInterval(from, to, start),
                new UnivariateObjectiveFunction(
                    x -> {
                      double at = Math.min(Math.max(hz * Math.exp(x), lowHz), highHz);
                      double t = first(limit, place.at(at), growth);
                      return Math.max(-FAR, Math.min(FAR, Math.log(t)));
                    }))
            .getValue();
    return logT < FAR ? Math.exp(logT) : Double.POSITIVE_INFINITY;
  }
}
