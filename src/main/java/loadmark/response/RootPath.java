package loadmark.response;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import org.apache.commons.math3.complex.Complex;

/**
 * A root that moves with a factor from 0 to 1.
 *
 * @param at where it has come to; empty where it left the upper half plane, or was damped nearly
 *     that much, or was lost
 * @param told whether it could be told from the others all the way
 */
record RootPath(Optional<Complex> at, boolean told) {
  /** Roots this close, relative, are one for all that can be seen. */
  static final double SAME = 1e-8;

  /** A step is small enough where a root moves by less than this part of its distance to others. */
  private static final double MOST_OF_DISTANCE = 0.2;

  /** A damping ratio so near to 1 that the root will be two real ones at once, or soon. */
  private static final double DAMPED = 0.9;

  /** Steps below this part of the factor are not tried. */
  private static final double LEAST_STEP = 1e-7;

  /** Factors below this count as this. */
  private static final double LEAST_FACTOR = 1e-12;

  /**
   * Follows roots by steps of the factor so small that none can be taken for another.
   *
   * @param roots all roots of the upper half plane at a factor
   */
  static List<RootPath> follow(List<Complex> starts, DoubleFunction<List<Complex>> roots) {
    List<RootPath> paths = starts.stream().map(s -> new RootPath(Optional.of(s), true)).toList();
    List<Complex> now = roots.apply(0);
    double factor = 0;
    double step = 1;
    while (factor < 1 && paths.stream().anyMatch(path -> path.at.isPresent())) {
      double next = Math.min(1, factor + step);
      List<Complex> then = roots.apply(next);
      List<RootPath> moved = move(paths, now, then);
      boolean all = moved.stream().filter(RootPath::told).count() == toldBefore(paths);
      if (all || step < LEAST_STEP * Math.max(factor, LEAST_FACTOR)) {
        paths = moved;
        now = then;
        factor = next;
        step *= 2;
      } else {
        step /= 2;
      }
    }
    return paths;
  }

  private static long toldBefore(List<RootPath> paths) {
    return paths.stream().filter(RootPath::told).count();
  }

  private static List<RootPath> move(List<RootPath> paths, List<Complex> now, List<Complex> then) {
    return paths.stream()
        .map(path -> path.at.isPresent() ? path.to(path.at.get(), now, then) : path)
        .toList();
  }

  private RootPath to(Complex s, List<Complex> now, List<Complex> then) {
    Optional<Complex> next =
        then.stream()
            .min(Comparator.comparingDouble(t -> t.subtract(s).abs()))
            .filter(
                t ->
                    t.subtract(s).abs() < MOST_OF_DISTANCE * Math.min(room(s, now), room(t, then)));
    boolean lost = next.isEmpty();
    return new RootPath(next.filter(t -> Resonance.damping(t) < DAMPED), told && !lost);
  }

  /** The distance to the next root, its own mirror image among them. */
  private static double room(Complex s, List<Complex> all) {
    return all.stream()
        .mapToDouble(other -> other.subtract(s).abs())
        .filter(distance -> distance > SAME * s.abs())
        .reduce(2 * s.getImaginary(), Math::min);
  }
}
