package loadmark.allowance;

import java.util.List;
import java.util.stream.DoubleStream;

/**
 * When a growing load breaks a limit at one frequency: where any of some quadratics in t is above
 * 0, or where all are.
 */
record Breach(List<Quadratic> parts, boolean needsAll) {
  static final Breach NEVER = new Breach(List.of(), false);
  static final Breach ALWAYS = any(new Quadratic(1, 0, 0));

  Breach {
    parts = List.copyOf(parts);
  }

  static Breach any(Quadratic... parts) {
    return new Breach(List.of(parts), false);
  }

  static Breach all(Quadratic... parts) {
    return new Breach(List.of(parts), true);
  }

  /**
   * The t from which on the limit is broken for the first time; infinite where it never is.
   *
   * @param slack the same limit with its tolerance: what does not break that is no breach
   */
  double first(Breach slack) {
    double first = first(this, slack);
    // A start between the bound and its tolerance is kept; then the tolerance alone decides.
    return first == 0 ? first(slack, slack) : first;
  }

  private static double first(Breach edges, Breach test) {
    double[] roots =
        edges.parts.stream()
            .flatMapToDouble(Quadratic::positiveRoots)
            .sorted()
            .distinct()
            .toArray();
    double low = 0;
    for (double high : DoubleStream.concat(DoubleStream.of(roots), end(roots)).toArray()) {
      if (test.isBroken(low + (high - low) / 2)) {
        return low;
      }
      low = high;
    }
    return Double.POSITIVE_INFINITY;
  }

  /** Past the last root nothing changes any more, so any value there will do. */
  private static DoubleStream end(double[] roots) {
    return DoubleStream.of(roots.length == 0 ? 1 : 3 * roots[roots.length - 1]);
  }

  private boolean isBroken(double t) {
    return !parts.isEmpty()
        && (needsAll
            ? parts.stream().allMatch(q -> q.at(t) > 0)
            : parts.stream().anyMatch(q -> q.at(t) > 0));
  }
}
