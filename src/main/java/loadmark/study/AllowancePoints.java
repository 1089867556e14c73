package loadmark.study;

import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.DoubleStream;
import loadmark.network.Band;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.network.Network;
import loadmark.network.Sweep;

/** The frequencies at which single allowances are told. */
final class AllowancePoints {
  /** A point of the sweep this near to the end of a scope, relative, is that end. */
  private static final double SAME = 1e-9;

  private AllowancePoints() {}

  /**
   * The sweep's points and the ends of every scope of a limit on the change, so that a limit at a
   * single frequency is told too. Without a sweep the scopes are swept.
   *
   * @return Hz, rising
   */
  static double[] of(Network network) {
    TreeSet<Double> marks = new TreeSet<>();
    TreeSet<Double> points = new TreeSet<>();
    network.sweep().ifPresent(s -> add(points, SweepPoints.of(s)));
    for (Limit limit : network.limits()) {
      if (limit.criterion() == Criterion.CHANGE) {
        for (Band band : limit.scope()) {
          add(marks, band.fromHz(), band.toHz());
          if (network.sweep().isEmpty() && !band.isPoint()) {
            add(points, SweepPoints.of(sweep(band)));
          }
        }
      }
    }
    points.removeIf(hz -> marks.stream().anyMatch(m -> Math.abs(m - hz) <= SAME * m));
    points.addAll(marks);
    return points.stream().mapToDouble(Double::doubleValue).toArray();
  }

  private static void add(Set<Double> set, double... hz) {
    DoubleStream.of(hz).forEach(set::add);
  }

  private static Sweep sweep(Band band) {
    double decades = Math.log10(band.toHz() / band.fromHz());
    int points = (int) Math.ceil(Sweep.DEFAULT_PER_DECADE * decades) + 1;
    return new Sweep(false, Optional.of(band), Math.max(Sweep.LEAST_POINTS, points), 0);
  }
}
