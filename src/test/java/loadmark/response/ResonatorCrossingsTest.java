package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import java.util.stream.LongStream;
import loadmark.network.Band;
import loadmark.network.Criterion;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Resonators of Q 1e3 to 1e6, with levels a little below their peaks. */
class ResonatorCrossingsTest {
  private static final Band BAND = new Band(1e4, 1e8);
  private static final int SAMPLE = 15;
  private static final int ALL = 50;
  private static final List<Criterion> CRITERIA =
      List.of(
          Criterion.CHANGE,
          Criterion.MAGNITUDE_CHANGE,
          Criterion.PHASE_CHANGE,
          Criterion.MAGNITUDE,
          Criterion.PHASE);

  /** Phase changes below it are rounding. */
  private static final double LEAST_LEVEL = 1e-9;

  static LongStream sample() {
    return LongStream.range(0, SAMPLE);
  }

  static LongStream all() {
    return LongStream.range(SAMPLE, ALL);
  }

  @ParameterizedTest
  @MethodSource("sample")
  void bandsAMillionthWideAreFound(long seed) {
    check(seed);
  }

  @Tag("thorough")
  @ParameterizedTest
  @MethodSource("all")
  void bandsAMillionthWideAreFoundInAll(long seed) {
    check(seed);
  }

  private static void check(long seed) {
    Network network = ResonatorNetworks.of(seed);
    Port port = network.ports().get(0);
    List<Load> loads = network.loads();
    OnePort any = OnePort.of(ElementKind.RESISTANCE, 50);
    PortCurves curves = new PortCurves(network, port, loads, List.of(), any);
    Crossings crossings = Crossings.of(network, port, loads, List.of());
    double[] scan = scan(network, port, loads);
    Random random = new Random(seed);
    for (Criterion criterion : CRITERIA) {
      double[] value = new double[scan.length];
      List<Double> peaks = new ArrayList<>();
      for (int i = 0; i < scan.length; i++) {
        value[i] = curves.level(criterion, false, 1, scan[i]).value();
        if (i > 1 && value[i - 1] > value[i - 2] && value[i - 1] >= value[i]) {
          peaks.add(scan[i - 1]);
        }
      }
      if (peaks.isEmpty()) {
        continue;
      }
      double peak = peaks.get(random.nextInt(peaks.size()));
      double below = 1 - Math.pow(10, -7 * random.nextDouble());
      Level level = curves.level(criterion, false, below, peak);
      if (level.value() > LEAST_LEVEL) {
        check(seed, level, scan, value, curves, crossings);
      }
    }
  }

  private static void check(
      long seed,
      Level level,
      double[] scan,
      double[] value,
      PortCurves curves,
      Crossings crossings) {
    double[] candidates = crossings.candidates(level, BAND);
    SignChanges found = SignChanges.find(hz -> curves.excess(level, hz), candidates, BAND);
    List<Double> missed = new ArrayList<>();
    for (int i = 1; i < scan.length; i++) {
      double from = scan[i - 1];
      double to = scan[i];
      boolean crosses = value[i - 1] > level.value() != value[i] > level.value();
      if (crosses && found.edges().stream().noneMatch(e -> from <= e && e <= to)) {
        missed.add(to);
      }
    }
    assertThat(missed).as("seed %s, %s, scanned crossings not found", seed, level).isEmpty();
    assertThat(found.complete()).as("seed %s, %s", seed, level).isTrue();
  }

  /** Ever denser towards every pole and zero with and without the load. */
  private static double[] scan(Network network, Port port, List<Load> loads) {
    TreeSet<Double> points = new TreeSet<>();
    for (int i = 0; i < 400; i++) {
      points.add(BAND.fromHz() * Math.pow(BAND.toHz() / BAND.fromHz(), i / 399.0));
    }
    List<Complex> roots = new ArrayList<>();
    for (PortRoots each :
        List.of(PortRoots.of(network, port, loads), PortRoots.of(network, port, List.of()))) {
      roots.addAll(each.poles());
      roots.addAll(each.zeros());
    }
    for (Complex root : roots) {
      for (int i = -60; i <= 60 && root.getImaginary() > 0; i++) {
        double away = root.getReal() * Math.sinh(i / 6.0) / 20;
        double hz = (root.getImaginary() + away) / (2 * Math.PI);
        if (BAND.fromHz() < hz && hz < BAND.toHz()) {
          points.add(hz);
        }
      }
    }
    return points.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
