package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import loadmark.network.Band;

/**
 * Where a function of frequency changes its sign, from candidates that are right but for rounding.
 *
 * @param edges Hz, ascending, each between two neighbouring doubles of opposite sign, or where the
 *     function is 0
 * @param positive the sign before the first edge, between each and the next, and after the last
 * @param complete whether the sign between neighbouring candidates was one and the same wherever it
 *     was looked at
 */
record SignChanges(List<Double> edges, List<Boolean> positive, boolean complete) {
  /** Where between two neighbours the sign is looked at, as parts of their ratio. */
  private static final double[] BETWEEN = {0.02, 0.25, 0.5, 0.75, 0.98};

  /** Candidates closer than this, relative, may stand for crossings that lie beside them. */
  private static final double CLOSE = 1e-4;

  SignChanges {
    edges = List.copyOf(edges);
    positive = List.copyOf(positive);
  }

  /**
   * The sign changes of {@code value} in the band.
   *
   * @param value of a frequency in Hz; 0 counts as not positive. May be infinite; where it is NaN
   *     the result is not complete
   * @param candidates Hz, ascending, inside the band
   */
  static SignChanges find(DoubleUnaryOperator value, double[] candidates, Band band) {
    return new Search(value).run(candidates, band);
  }

  /** A point that was looked at. */
  private record Point(double hz, double value) {
    boolean isPositive() {
      return value > 0;
    }
  }

  private static final class Search {
    private final DoubleUnaryOperator value;
    private final List<Double> edges = new ArrayList<>();
    private final List<Boolean> positive = new ArrayList<>();
    private boolean complete = true;

    Search(DoubleUnaryOperator value) {
      this.value = value;
    }

    SignChanges run(double[] candidates, Band band) {
      Point last = at(band.fromHz());
      positive.add(last.isPositive());
      for (int i = 0; i <= candidates.length; i++) {
        double from = last.hz;
        double to = i < candidates.length ? candidates[i] : band.toHz();
        boolean close = to <= from * (1 + CLOSE);
        for (int k = 0; k < BETWEEN.length && to > from; k++) {
          Point next = at(from * Math.pow(to / from, BETWEEN[k]));
          step(last, next, k == 0 || close);
          last = next;
        }
        Point node = at(to);
        step(last, node, true);
        last = node;
      }
      return new SignChanges(edges, positive, complete);
    }

    private Point at(double hz) {
      double found = value.applyAsDouble(hz);
      complete &= !Double.isNaN(found);
      return new Point(hz, found);
    }

    private void step(Point a, Point b, boolean expected) {
      if (a.isPositive() != b.isPositive()) {
        complete &= expected;
        edges.add(root(a, b));
        positive.add(b.isPositive());
      }
    }

    /** By bisection and the secant in turn, until no double lies between. */
    private double root(Point from, Point to) {
      Point a = from;
      Point b = to;
      for (int i = 0; Math.nextUp(a.hz) < b.hz; i++) {
        double part = a.value / (a.value - b.value);
        boolean secant = i % 3 != 2 && part > 0 && part < 1;
        double hz = a.hz + (b.hz - a.hz) * (secant ? part : 0.5);
        double inside = Math.min(Math.max(hz, Math.nextUp(a.hz)), Math.nextDown(b.hz));
        Point middle = at(inside);
        if (middle.value == 0) {
          return inside;
        }
        if (middle.isPositive() == a.isPositive()) {
          a = middle;
        } else {
          b = middle;
        }
      }
      return Math.abs(a.value) <= Math.abs(b.value) ? a.hz : b.hz;
    }
  }
}
