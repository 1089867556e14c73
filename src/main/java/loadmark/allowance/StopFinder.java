package loadmark.allowance;

import static java.util.Comparator.comparingDouble;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.IntStream;
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
  private static final int LEAST_STEPS = 100;

  /** Into so many parts a band is cut that turned out to be broken. */
  private static final int IN_BAND = 16;

  /** How much farther than its neighbours rise a valley may fall: a parabola needs 1/8. */
  private static final double REACH = 4;

  /** Relative, of the frequency: a valley's depth is right to its square, a kink's to it. */
  private static final double PRECISION = 1e-10;

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
    limits.forEach(l -> l.scope().forEach(band -> addPoints(band, steps(band), all)));
    double[] hz = all.stream().mapToDouble(Double::doubleValue).toArray();
    List<LoadPlace.Point> points = place.at(hz);
    for (Limit limit : limits) {
      grids.add(limit.scope().stream().map(band -> inside(points, band)).toList());
    }
  }

  /** Both ends, and what cuts the band into equal logarithmic steps. */
  private static void addPoints(Band band, int steps, SortedSet<Double> all) {
    all.add(band.fromHz());
    all.add(band.toHz());
    for (int i = 1; i < steps && !band.isPoint(); i++) {
      all.add(band.fromHz() * Math.pow(band.toHz() / band.fromHz(), (double) i / steps));
    }
  }

  private static int steps(Band band) {
    double decades = band.isPoint() ? 0 : Math.log10(band.toHz() / band.fromHz());
    return (int) Math.max(LEAST_STEPS, Math.ceil(PER_DECADE * decades));
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
      TreeSet<Double> hz = new TreeSet<>();
      addPoints(broken.band(), IN_BAND, hz);
      hz.add(broken.worst().hz());
      List<LoadPlace.Point> points =
          place.at(hz.stream().mapToDouble(Double::doubleValue).toArray());
      first = first.sooner(least(limit, growth, points));
    }
    return first;
  }

  private Stop least(Limit limit, Growth growth, List<LoadPlace.Point> points) {
    double[] t = points.stream().mapToDouble(p -> first(limit, p, growth)).toArray();
    int last = t.length - 1;
    double least = Double.POSITIVE_INFINITY;
    // The lowest first: most of the others then cannot lead lower any more.
    for (int i :
        IntStream.rangeClosed(0, last)
            .boxed()
            .sorted(comparingDouble((Integer i) -> t[i]))
            .toList()) {
      if (t[i] == 0 || t[i] == Double.POSITIVE_INFINITY) {
        return Stop.at(Math.min(least, t[i]), limit);
      }
      double before = t[Math.max(i - 1, 0)];
      double after = t[Math.min(i + 1, last)];
      double rise = Math.max(before, after) - t[i];
      least = Math.min(least, t[i]);
      if (t[i] <= before && t[i] <= after && rise > 0 && t[i] - REACH * rise < least) {
        double low = hz(points.get(Math.max(i - 1, 0)));
        double high = hz(points.get(Math.min(i + 1, last)));
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
