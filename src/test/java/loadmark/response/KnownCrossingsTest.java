package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import loadmark.network.Band;
import loadmark.network.Criterion;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Crossings that closed forms give. */
class KnownCrossingsTest {
  private static final Band BAND = new Band(1e-3, 1e2);
  private static final OnePort ONE_OHM = OnePort.of(ElementKind.RESISTANCE, 1);

  /** A simple crossing is an eigenvalue that is right to rounding. */
  private static final double SIMPLE_PERCENT = 1e-7;

  /** One of a close pair is right to rounding over their distance, which is 1e-8 at the least. */
  private static final double PAIR_PERCENT = 1e-6;

  /** A touching point is a double eigenvalue, right to the root of rounding. */
  private static final double TOUCHING_PERCENT = 1e-4;

  /** Matthaei, Young, Jones, Microwave Filters, 1964, §4.05. */
  private static double[] butterworth(int n) {
    double[] g = new double[n];
    for (int k = 1; k <= n; k++) {
      g[k - 1] = 2 * Math.sin((2 * k - 1) * Math.PI / (2 * n));
    }
    return g;
  }

  /** The same, §4.05, with β in its exact form. */
  private static double[] chebyshev(int n, double ripple) {
    double root = Math.sqrt(1 + ripple * ripple);
    double gamma = Math.sinh(Math.log((root + 1) / (root - 1)) / (2 * n));
    double[] g = new double[n];
    double a = Math.sin(Math.PI / (2 * n));
    g[0] = 2 * a / gamma;
    for (int k = 2; k <= n; k++) {
      double next = Math.sin((2 * k - 1) * Math.PI / (2 * n));
      double sine = Math.sin((k - 1) * Math.PI / n);
      g[k - 1] = 4 * a * next / ((gamma * gamma + sine * sine) * g[k - 2]);
      a = next;
    }
    return g;
  }

  private static Network ladder(double[] g) {
    Sketch sketch = new Sketch();
    Node at = sketch.node();
    for (int k = 0; k < g.length; k++) {
      if (k % 2 == 0) {
        sketch.capacitor(at, sketch.ground(), g[k]);
      } else {
        Node next = sketch.node();
        sketch.inductor(at, next, g[k]);
        at = next;
      }
    }
    return sketch.resistor(at, sketch.ground(), 1).network();
  }

  private static double[] candidates(Network network, Level level) {
    Crossings crossings = Crossings.of(network, network.ports().get(0), network.loads(), List.of());
    assertThat(crossings.findObstacle()).isEmpty();
    return crossings.candidates(level, BAND);
  }

  private static List<Double> omegas(double[] hz) {
    return Arrays.stream(hz).map(f -> 2 * Math.PI * f).boxed().toList();
  }

  private static Level returnLoss(double decibels) {
    return Level.of(Criterion.RETURN_LOSS, Optional.of(ONE_OHM), decibels);
  }

  private static void contains(List<Double> omegas, double expected, double percent) {
    assertThat(omegas)
        .anySatisfy(o -> assertThat(o).isCloseTo(expected, withinPercentage(percent)));
  }

  @ParameterizedTest
  @CsvSource({"1, 3", "3, 1", "3, 20", "5, 40", "7, 10", "9, 26", "15, 12"})
  void butterworthLaddersCrossAReturnLossOnce(int n, double decibels) {
    double power = Math.pow(10, -decibels / 10);
    double expected = Math.pow(power / (1 - power), 1.0 / (2 * n));
    List<Double> omegas = omegas(candidates(ladder(butterworth(n)), returnLoss(decibels)));
    contains(omegas, expected, SIMPLE_PERCENT);
    assertThat(omegas).hasSize(1);
  }

  @ParameterizedTest
  @ValueSource(ints = {3, 5, 7, 9, 11})
  void chebyshevLaddersTouchTheirReturnLossInTheBandAndCrossItAtItsEnd(int n) {
    double square = Math.pow(10, 0.5 / 10) - 1;
    double bound = 10 * Math.log10((1 + square) / square);
    Network network = ladder(chebyshev(n, Math.sqrt(square)));
    List<Double> omegas = omegas(candidates(network, returnLoss(bound)));
    contains(omegas, 1, SIMPLE_PERCENT);
    for (int k = 1; k <= (n - 1) / 2; k++) {
      contains(omegas, Math.cos(k * Math.PI / n), TOUCHING_PERCENT);
    }
    for (double omega : omegas) {
      double nearest =
          Math.cos(Math.rint(Math.acos(Math.min(omega, 1)) * n / Math.PI) * Math.PI / n);
      assertThat(omega).isCloseTo(nearest, withinPercentage(TOUCHING_PERCENT));
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {3, 5, 7, 9, 11})
  void chebyshevLaddersCrossALittleMoreReturnLossTwiceBesideEachTouchingPoint(int n) {
    double square = Math.pow(10, 0.5 / 10) - 1;
    double asked = 10 * Math.log10((1 + square) / square) + 1e-6;
    double power = Math.pow(10, -asked / 10);
    double t = Math.sqrt(power / (1 - power) / square);
    Network network = ladder(chebyshev(n, Math.sqrt(square)));
    List<Double> omegas = omegas(candidates(network, returnLoss(asked)));
    assertThat(omegas).hasSize(n);
    for (int k = 0; k < n; k++) {
      double angle = (Math.acos(t) + k * Math.PI) / n;
      double mirrored = (Math.acos(-t) + k * Math.PI) / n;
      contains(omegas, Math.abs(Math.cos(k % 2 == 0 ? angle : mirrored)), PAIR_PERCENT);
    }
  }

  @ParameterizedTest
  @CsvSource({"1e5, 1e-6", "1e7, 1e-6", "1e9, 1e-6", "1e5, 1e-9", "1e9, 1e-9"})
  void theSmallestOfChangesAreCrossedWhereTheClosedFormSays(double ohm, double below) {
    double henry = 1000 * ohm;
    double farad = 1 / henry;
    Network network = smallChange(ohm, henry, farad);
    double peak = 1 / (1 + ohm);
    double gamma = peak * (1 - below);
    double x = Math.sqrt((1 / gamma - (1 + ohm)) * (1 / gamma + (1 + ohm)));
    double half = x / (2 * henry);
    double root = Math.sqrt(half * half + 1);
    List<Double> omegas =
        omegas(candidates(network, Level.of(Criterion.CHANGE, Optional.empty(), gamma)));
    assertThat(omegas).hasSize(2);
    assertThat(omegas.get(0)).isCloseTo(root - half, withinPercentage(PAIR_PERCENT));
    assertThat(omegas.get(1)).isCloseTo(root + half, withinPercentage(PAIR_PERCENT));
  }

  @ParameterizedTest
  @ValueSource(doubles = {1e5, 1e7, 1e9})
  void aLevelAboveTheSmallestOfChangesHasNoneButTheNearestPoint(double ohm) {
    Network network = smallChange(ohm, 1000 * ohm, 1 / (1000 * ohm));
    double gamma = (1 + 1e-6) / (1 + ohm);
    List<Double> omegas =
        omegas(candidates(network, Level.of(Criterion.CHANGE, Optional.empty(), gamma)));
    assertThat(omegas).allSatisfy(o -> assertThat(o).isCloseTo(1, within(1e-3)));
  }

  /** 1 Ω, loaded by a series resonance at 1 rad/s: change −1/(1 + R + jX). */
  private static Network smallChange(double ohm, double henry, double farad) {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    OnePort load =
        OnePort.series(
            List.of(
                OnePort.of(ElementKind.RESISTANCE, ohm),
                OnePort.of(ElementKind.INDUCTANCE, henry),
                OnePort.of(ElementKind.CAPACITANCE, farad)));
    return sketch.resistor(in, sketch.ground(), 1).shunt(in, sketch.ground(), load).network();
  }

  @Test
  void anUnboundedChangeIsCrossedOnBothSidesOfItsPole() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    Node middle = sketch.node();
    Node last = sketch.node();
    sketch.inductor(in, middle, 1).capacitor(middle, last, 1);
    sketch.series(last, sketch.ground(), OnePort.of(ElementKind.RESISTANCE, 0.01));
    // Z without is j(ω − 1/ω), so that |0.01/Z| = 0.1 where ω − 1/ω = ±0.1.
    List<Double> omegas =
        omegas(candidates(sketch.network(), Level.of(Criterion.CHANGE, Optional.empty(), 0.1)));
    assertThat(omegas).hasSize(2);
    assertThat(omegas.get(0)).isCloseTo(Math.sqrt(1.0025) - 0.05, withinPercentage(SIMPLE_PERCENT));
    assertThat(omegas.get(1)).isCloseTo(Math.sqrt(1.0025) + 0.05, withinPercentage(SIMPLE_PERCENT));
  }

  @Test
  void aLosslessPortChangesItsPhaseAtItsPolesAndZeros() {
    List<Double> omegas =
        omegas(
            candidates(FosterExample.network(), Level.of(Criterion.PHASE, Optional.empty(), 45)));
    assertThat(omegas).isNotEmpty();
    contains(omegas, FosterExample.FIRST_ZERO, SIMPLE_PERCENT);
    contains(omegas, 1, SIMPLE_PERCENT);
    contains(omegas, FosterExample.SECOND_ZERO, SIMPLE_PERCENT);
  }

  @Test
  void aLosslessPortHasTheReactanceOfItsRationalForm() {
    Level level = Level.of(Criterion.MAGNITUDE, Optional.empty(), FosterExample.MAGNITUDE_AT_0_3);
    contains(omegas(candidates(FosterExample.network(), level)), 0.3, SIMPLE_PERCENT);
  }

  @Test
  void withoutReactiveElementsNothingIsCrossed() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    sketch.resistor(in, sketch.ground(), 50);
    Network network =
        sketch.shunt(in, sketch.ground(), OnePort.of(ElementKind.RESISTANCE, 1e3)).network();
    for (Criterion criterion : Criterion.values()) {
      boolean within =
          criterion == Criterion.MAGNITUDE_WITHIN || criterion == Criterion.PHASE_WITHIN;
      Optional<OnePort> reference =
          within || criterion == Criterion.RETURN_LOSS ? Optional.of(ONE_OHM) : Optional.empty();
      assertThat(candidates(network, Level.of(criterion, reference, 0.02))).isEmpty();
    }
  }

  @Test
  void aChangeThatIsExactlyZeroCrossesNothing() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    Node left = sketch.node();
    Node right = sketch.node();
    // A balanced bridge: the load in its diagonal carries nothing.
    sketch.resistor(in, left, 1).resistor(in, right, 1);
    sketch.capacitor(left, sketch.ground(), 1).capacitor(right, sketch.ground(), 1);
    Network network = sketch.shunt(left, right, OnePort.of(ElementKind.CAPACITANCE, 5)).network();
    assertThat(candidates(network, Level.of(Criterion.CHANGE, Optional.empty(), 1e-9))).isEmpty();
  }
}
