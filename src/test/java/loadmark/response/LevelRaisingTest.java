package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import java.util.Optional;
import loadmark.network.Band;
import loadmark.network.Criterion;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LevelRaisingTest {
  private static final Band BAND = new Band(1e4, 1e8);
  private static final OnePort ANY = OnePort.of(ElementKind.RESISTANCE, 50);

  /** The value is promised to 1e-9. */
  private static final double PERCENT = 1e-7;

  private static LevelRaising.Top raise(Network network, double[] starts) {
    Port port = network.ports().get(0);
    PortCurves curves = new PortCurves(network, port, network.loads(), List.of(), ANY);
    Crossings crossings = Crossings.of(network, port, network.loads(), List.of());
    return LevelRaising.raise(
        hz -> curves.at(hz).change().abs(),
        level -> crossings.candidates(Level.of(Criterion.CHANGE, Optional.empty(), level), BAND),
        BAND,
        starts);
  }

  /** Without any start: a peak a millionth wide, whose height the closed form gives. */
  @ParameterizedTest
  @ValueSource(doubles = {1e3, 1e5, 1e6})
  void theTopOfANarrowPeakIsFoundFromNothing(double q) {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    double omega = 2 * Math.PI * 1.2345e6;
    double ohm = 1000;
    OnePort load =
        OnePort.series(
            List.of(
                OnePort.of(ElementKind.RESISTANCE, ohm),
                OnePort.of(ElementKind.INDUCTANCE, q * ohm / omega),
                OnePort.of(ElementKind.CAPACITANCE, 1 / (q * ohm * omega))));
    Network network =
        sketch.resistor(in, sketch.ground(), 1).shunt(in, sketch.ground(), load).network();
    LevelRaising.Top top = raise(network, new double[0]);
    assertThat(top.certain()).isTrue();
    assertThat(top.value()).isCloseTo(1 / (1 + ohm), withinPercentage(PERCENT));
    assertThat(top.hz()).isCloseTo(1.2345e6, withinPercentage(1e-4));
  }

  /** Nothing in a scan that is densest at the poles and zeros is higher. */
  @ParameterizedTest
  @ValueSource(longs = {1, 3, 6})
  void noScannedPointIsHigher(long seed) {
    Network network = ResonatorNetworks.of(seed);
    Port port = network.ports().get(0);
    PortCurves curves = new PortCurves(network, port, network.loads(), List.of(), ANY);
    LevelRaising.Top top = raise(network, new double[0]);
    assertThat(top.certain()).as("seed %s", seed).isTrue();
    for (PortRoots roots :
        List.of(
            PortRoots.of(network, port, network.loads()), PortRoots.of(network, port, List.of()))) {
      for (Complex root : roots.poles()) {
        checkAround(root, curves, top, seed);
      }
      for (Complex root : roots.zeros()) {
        checkAround(root, curves, top, seed);
      }
    }
  }

  private static void checkAround(
      Complex root, PortCurves curves, LevelRaising.Top top, long seed) {
    for (double away = -3; away <= 3; away += 0.01) {
      double hz = (Math.abs(root.getImaginary()) + away * root.getReal()) / (2 * Math.PI);
      if (BAND.fromHz() < hz && hz < BAND.toHz()) {
        double value = curves.at(hz).change().abs();
        assertThat(value).as("seed %s, %s Hz", seed, hz).isLessThan(top.value() * (1 + 1e-9));
      }
    }
  }
}
