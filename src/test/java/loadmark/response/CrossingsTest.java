package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import loadmark.network.Band;
import loadmark.network.Criterion;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Random networks of 2 to 20 reactive elements, every criterion, against a scan. */
class CrossingsTest {
  private static final Band BAND = new Band(1e3, 1e9);
  private static final int SAMPLE = 40;
  private static final int ALL = 1000;
  private static final int POINTS = 3000;
  private static final int FINE_POINTS = 20000;

  /** Beyond this the scan itself has not digits enough for its signs to mean anything. */
  private static final double WORST_CONDITION = 1e6;

  static LongStream sample() {
    return LongStream.range(0, SAMPLE);
  }

  static LongStream all() {
    return LongStream.range(SAMPLE, ALL);
  }

  @ParameterizedTest
  @MethodSource("sample")
  void noCrossingIsMissedAndNoneInvented(long seed) {
    check(seed, POINTS);
  }

  @Tag("thorough")
  @ParameterizedTest
  @MethodSource("all")
  void noCrossingIsMissedAndNoneInventedInManyNetworks(long seed) {
    check(seed, FINE_POINTS);
  }

  private static void check(long seed, int points) {
    Random random = new Random(seed);
    Network network = RandomNetworks.of(seed, 2 + (int) (seed % 19));
    List<Load> on = network.loads();
    boolean several = on.size() > 1;
    List<Load> against = several && seed % 3 == 0 ? on.subList(0, 1) : List.of();
    List<Load> loads = several && seed % 6 == 0 ? on.subList(1, on.size()) : on;
    OnePort reference = reference(random);
    PortCurves curves = new PortCurves(network, network.ports().get(0), loads, against, reference);
    Crossings crossings = Crossings.of(network, network.ports().get(0), loads, against);
    PortCurves.Point[] scan = new PortCurves.Point[points];
    for (int i = 0; i < points; i++) {
      scan[i] = curves.at(scanned(i, points));
    }
    for (Criterion criterion : Criterion.values()) {
      check(seed, curves, crossings, criterion, false, random, scan);
    }
    check(seed, curves, crossings, Criterion.CHANGE, true, random, scan);
  }

  private static OnePort reference(Random random) {
    return OnePort.parallel(
        List.of(
            OnePort.of(ElementKind.RESISTANCE, Math.pow(10, 1 + 3 * random.nextDouble())),
            OnePort.of(ElementKind.CAPACITANCE, Math.pow(10, -13 + 4 * random.nextDouble()))));
  }

  private static double scanned(int i, int points) {
    double part = i / (points - 1.0);
    return BAND.fromHz() * Math.pow(BAND.toHz() / BAND.fromHz(), part);
  }

  private static void check(
      long seed,
      PortCurves curves,
      Crossings crossings,
      Criterion criterion,
      boolean inOhm,
      Random random,
      PortCurves.Point[] scan) {
    int points = scan.length;
    double at = scanned(random.nextInt(points), points);
    Level level = curves.level(criterion, inOhm, 1 + 1e-3 * random.nextDouble(), at);
    if (!(curves.condition(level, at) < WORST_CONDITION)) {
      return;
    }
    double[] candidates = crossings.candidates(level, BAND);
    SignChanges found = SignChanges.find(hz -> curves.excess(level, hz), candidates, BAND);
    List<Double> missed = new ArrayList<>();
    boolean before = curves.excess(level, scan[0], scanned(0, points)) > 0;
    for (int i = 1; i < points; i++) {
      double from = scanned(i - 1, points);
      double to = scanned(i, points);
      boolean now = curves.excess(level, scan[i], to) > 0;
      if (now != before && found.edges().stream().noneMatch(e -> from <= e && e <= to)) {
        missed.add(to);
      }
      before = now;
    }
    assertThat(missed).as("seed %s, %s, scanned crossings not found", seed, level).isEmpty();
    assertThat(found.complete())
        .as(
            "seed %s, %s, one sign between neighbours of %s",
            seed, level, Arrays.toString(candidates))
        .isTrue();
  }
}
