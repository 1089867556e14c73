package loadmark.response;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import loadmark.network.Band;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;

/** Crossings as eigenvalues near the axis, each from the nearest of a few real shifts. */
final class AlgebraicCrossings implements Crossings {
  static final int MOST_REACTIVE = 80;
  private static final int MOST_ELEMENTS = 600;

  /** A double root comes out at this distance from the axis at most, relative to itself. */
  private static final double NEAR_AXIS = 1e-3;

  /** How far a shift looks beyond its own part of the band. */
  private static final double OVERLAP = 1.1;

  /** What two shifts find this close to each other, relative, is one and the same. */
  private static final double SAME = 1e-9;

  /** A candidate this far beyond an end of the band may be a crossing at the end. */
  private static final double AT_END = 1 + 1e-6;

  private final PortSystems systems;

  AlgebraicCrossings(Network network, Port port, List<Load> loads, List<Load> against) {
    systems = new PortSystems(network, port, loads, against);
  }

  @Override
  public Optional<String> findObstacle() {
    if (systems.reactive() > MOST_REACTIVE) {
      return Optional.of(
          "it has " + systems.reactive() + " reactive elements, more than " + MOST_REACTIVE);
    }
    if (systems.elements() > MOST_ELEMENTS) {
      return Optional.of("it has " + systems.elements() + " elements, more than " + MOST_ELEMENTS);
    }
    return Optional.empty();
  }

  @Override
  public double[] candidates(Level level, Band band) {
    findObstacle()
        .ifPresent(
            why -> {
              throw new IllegalStateException(why);
            });
    if (band.fromHz() <= 0) {
      throw new IllegalArgumentException(band + " is not above 0 Hz");
    }
    int shifts = 1 + (int) Math.floor(Math.log10(band.toHz() / band.fromHz()));
    double step = Math.pow(band.toHz() / band.fromHz(), 1.0 / shifts);
    double half = Math.sqrt(step) * OVERLAP;
    double[] found = {};
    for (int i = 0; i < shifts; i++) {
      double centre = band.fromHz() * Math.pow(step, i + 0.5);
      double[] before = found;
      DoubleStream here =
          near(level, 2 * Math.PI * centre)
              .map(omega -> omega / (2 * Math.PI))
              .filter(hz -> centre / half <= hz && hz <= centre * half)
              .filter(hz -> Arrays.stream(before).noneMatch(b -> isSame(b, hz)));
      found = DoubleStream.concat(Arrays.stream(before), here).toArray();
    }
    return Arrays.stream(found)
        .filter(hz -> band.fromHz() / AT_END <= hz && hz <= band.toHz() * AT_END)
        .map(hz -> Math.min(Math.max(hz, band.fromHz()), band.toHz()))
        .sorted()
        .distinct()
        .toArray();
  }

  private static boolean isSame(double a, double b) {
    return Math.abs(a - b) <= SAME * a;
  }

  /** The candidates that a shift finds, rad/s. */
  private DoubleStream near(Level level, double s0) {
    return LevelCondition.of(level, systems, s0).stream()
        .flatMap(condition -> condition.roots().stream())
        .map(s -> s.multiply(s0))
        .filter(s -> Math.abs(s.getReal()) <= NEAR_AXIS * s.abs())
        .mapToDouble(s -> Math.abs(s.getImaginary()));
  }
}
