package loadmark.judge;

import java.util.List;
import loadmark.network.Band;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/**
 * What a grid must follow: magnitude and phase of the impedances, and the limits' excess inside
 * their scopes. A point is off the curve where a cubic through its four neighbours misses it; the
 * tolerance is finest where the points are farthest apart, since a narrow resonance shows there
 * only by its tails.
 */
final class Curves {
  private static final double FINEST = 1e-5;
  private static final double COARSEST = 1e-3;

  /** The step, in ln f, that the finest tolerance belongs to. */
  private static final double WIDEST_STEP = Math.log(10) / 200;

  /** How many times its estimated error a value may be off. */
  private static final double NOISE = 10;

  /** The first values are ln|Z| and the phase, in radians, with and without. */
  private static final int IMPEDANCES = 4;

  private final List<Scoped> limits;

  /** A limit's measure and where it holds. */
  record Scoped(Measure measure, List<Band> scope) {
    double level(Loading loading) {
      boolean inside =
          scope.stream().anyMatch(b -> b.fromHz() <= loading.hz() && loading.hz() <= b.toHz());
      return inside && measure.read(loading) instanceof Reading.Known known
          ? Math.tanh(known.excess() / 2)
          : Double.NaN;
    }
  }

  Curves(List<Scoped> limits) {
    this.limits = List.copyOf(limits);
  }

  double[] values(Loading loading) {
    double[] values = new double[IMPEDANCES + limits.size()];
    impedance(loading.with(), values, 0);
    impedance(loading.without(), values, 2);
    for (int i = 0; i < limits.size(); i++) {
      values[IMPEDANCES + i] = limits.get(i).level(loading);
    }
    return values;
  }

  private static void impedance(Ohms z, double[] values, int at) {
    boolean none = Angle.hasNone(z);
    values[at] = none ? Double.NaN : Math.log(z.magnitude());
    values[at + 1] = none ? Double.NaN : Math.atan2(z.im(), z.re());
  }

  /** For each point whether some curve is off there. */
  boolean[] offCurve(List<GridPoint> grid) {
    boolean[] off = new boolean[grid.size()];
    for (int i = 1; i + 1 < grid.size() && grid.size() >= 5; i++) {
      int first = Math.min(Math.max(i - 2, 0), grid.size() - 5);
      off[i] = isOff(grid.subList(first, first + 5), i - first);
    }
    return off;
  }

  private static boolean isOff(List<GridPoint> five, int middle) {
    GridPoint here = five.get(middle);
    double[] weights = weights(five, middle);
    double step =
        Math.max(here.x() - five.get(middle - 1).x(), five.get(middle + 1).x() - here.x());
    double tolerance = Math.min(COARSEST, FINEST * WIDEST_STEP / step) + NOISE * error(here);
    for (int curve = 0; curve < here.curves(); curve++) {
      boolean angle = curve == 1 || curve == 3;
      double miss = 0;
      for (int j = 0; j < 5; j++) {
        double difference = five.get(j).value(curve) - here.value(curve);
        miss += weights[j] * (angle ? Math.IEEEremainder(difference, 2 * Math.PI) : difference);
      }
      if (Math.abs(miss) > tolerance) {
        return true;
      }
    }
    return false;
  }

  /** Of the cubic through four of five points at the fifth (Lagrange); 0 for that one itself. */
  private static double[] weights(List<GridPoint> five, int middle) {
    double x = five.get(middle).x();
    double[] weights = new double[5];
    for (int j = 0; j < 5; j++) {
      double weight = j == middle ? 0 : 1;
      for (int k = 0; k < 5; k++) {
        if (k != j && k != middle && j != middle) {
          weight *= (x - five.get(k).x()) / (five.get(j).x() - five.get(k).x());
        }
      }
      weights[j] = weight;
    }
    return weights;
  }

  private static double error(GridPoint point) {
    Loading loading = point.loading();
    return known(loading.withError())
        + known(loading.withoutError())
        + known(loading.changeError());
  }

  private static double known(double error) {
    return Double.isFinite(error) ? error : 0;
  }
}
