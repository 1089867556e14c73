package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PortSystemsTest {
  /** The dense responses lose digits where admittances differ by many decades. */
  private static final double DENSE = 1e-4;

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
  void stateSpacesShowWhatTheResponsesShow(int seed) {
    Network network = RandomNetworks.of(seed, 2 + seed % 19);
    Port port = network.ports().get(0);
    List<Load> on = network.loads();
    List<Load> against = seed % 3 == 0 ? List.of(on.get(0)) : List.of();
    List<Load> loads = seed % 4 == 0 ? on.subList(1, on.size()) : on;
    Comparison comparison = Responses.of(network, port).compare(loads, against);
    PortSystems systems = new PortSystems(network, port, loads, against);
    double s0 = 2e6;
    FrequencyScan with = new FrequencyScan(systems.impedance(s0), s0);
    FrequencyScan change = new FrequencyScan(systems.change(false, s0), s0);
    FrequencyScan difference = new FrequencyScan(systems.change(true, s0), s0);
    FrequencyScan admittance = new FrequencyScan(systems.admittance(s0), s0);
    for (double hz = 1e3; hz < 1e9; hz *= 5) {
      Loading at = comparison.at(hz);
      Complex z = new Complex(at.with().re(), at.with().im());
      Complex without = new Complex(at.without().re(), at.without().im());
      close(with.at(hz), z, z.abs());
      close(admittance.at(hz).multiply(z), Complex.ONE, 1);
      close(change.at(hz), z.divide(without).subtract(1), 1 + z.divide(without).abs());
      close(difference.at(hz), z.subtract(without), z.abs() + without.abs());
    }
  }

  private static void close(Complex actual, Complex expected, double scale) {
    assertThat(actual.subtract(expected).abs()).isLessThan(DENSE * scale);
  }
}
