package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PortRootsTest {
  /** What simple roots are promised to. */
  private static final double SIMPLE = 1e-9;

  /** The product of all roots against the impedance, over up to forty of them. */
  private static final double PRODUCT = 1e-8;

  private static PortRoots roots(Network network) {
    return PortRoots.of(network, network.ports().get(0), network.loads());
  }

  private static void same(List<Complex> actual, Complex... expected) {
    assertThat(actual).hasSize(expected.length);
    for (Complex each : expected) {
      assertThat(actual)
          .as("%s among %s", each, actual)
          .anyMatch(root -> root.subtract(each).abs() <= SIMPLE * each.abs());
    }
  }

  @Test
  void reactanceHasItsZerosAndPolesOnTheAxis() {
    PortRoots roots = roots(FosterExample.network());
    double first = FosterExample.FIRST_ZERO;
    double second = FosterExample.SECOND_ZERO;
    same(roots.poles(), Complex.ZERO, new Complex(0, 1), new Complex(0, -1));
    same(
        roots.zeros(),
        new Complex(0, first),
        new Complex(0, -first),
        new Complex(0, second),
        new Complex(0, -second));
  }

  /** Textbook: zeros of s² + 3s + 1, poles of s(s + 2). */
  @Test
  void twoSectionsOfResistorAndCapacitorHaveTheirTextbookRoots() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    Node a = sketch.node();
    Node b = sketch.node();
    sketch.resistor(in, a, 1).capacitor(a, sketch.ground(), 1);
    sketch.resistor(a, b, 1).capacitor(b, sketch.ground(), 1);
    PortRoots roots = roots(sketch.network());
    double root = Math.sqrt(5) / 2;
    same(roots.poles(), Complex.ZERO, new Complex(-2));
    same(roots.zeros(), new Complex(-1.5 + root), new Complex(-1.5 - root));
  }

  /** Equal sections: poles and zeros of an open RC line, textbook: −4 sin² of equal angles. */
  @ParameterizedTest
  @ValueSource(ints = {3, 10, 30})
  void manyEqualSectionsHaveTheirClosedFormRoots(int n) {
    double ohm = 1e3;
    double farad = 1e-9;
    Sketch sketch = new Sketch();
    Node at = sketch.node();
    for (int i = 0; i < n; i++) {
      Node next = sketch.node();
      sketch.resistor(at, next, ohm).capacitor(next, sketch.ground(), farad);
      at = next;
    }
    PortRoots roots = roots(sketch.network());
    Complex[] poles = new Complex[n];
    Complex[] zeros = new Complex[n];
    for (int k = 0; k < n; k++) {
      double pole = Math.sin(k * Math.PI / (2 * n));
      double zero = Math.sin((2 * k + 1) * Math.PI / (2 * (2 * n + 1)));
      poles[k] = new Complex(-4 * pole * pole / (ohm * farad));
      zeros[k] = new Complex(-4 * zero * zero / (ohm * farad));
    }
    same(roots.poles(), poles);
    same(roots.zeros(), zeros);
  }

  @Test
  void whatThePortDoesNotSeeIsLeftOut() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    Node left = sketch.node();
    Node right = sketch.node();
    sketch.resistor(in, left, 1).resistor(in, right, 1);
    sketch.capacitor(left, sketch.ground(), 1).capacitor(right, sketch.ground(), 1);
    sketch.resistor(left, right, 3);
    PortRoots roots = roots(sketch.network());
    same(roots.poles(), Complex.ZERO);
    same(roots.zeros(), new Complex(-1));
  }

  @Test
  void resistorsHaveNoRoots() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    sketch.resistor(in, sketch.ground(), 1);
    PortRoots roots = roots(sketch.network());
    assertThat(roots.poles()).isEmpty();
    assertThat(roots.zeros()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
  void allRootsTogetherAreTheImpedanceButForAFactor(int seed) {
    Network network = RandomNetworks.of(seed, 2 + seed % 19);
    Port port = network.ports().get(0);
    PortRoots roots = PortRoots.of(network, port, network.loads());
    PortSystems systems = new PortSystems(network, port, network.loads(), List.of());
    double factor = Double.NaN;
    for (double omega = 1e3; omega < 1e10; omega *= 7) {
      Complex s = new Complex(0.3 * omega, omega);
      double log = Math.log(new FrequencyScan(systems.impedance(omega), omega).atS(s).abs());
      for (Complex zero : roots.zeros()) {
        log -= Math.log(s.subtract(zero).abs());
      }
      for (Complex pole : roots.poles()) {
        log += Math.log(s.subtract(pole).abs());
      }
      factor = Double.isNaN(factor) ? log : factor;
      assertThat(Math.abs(log - factor)).as("seed %s, %s rad/s", seed, omega).isLessThan(PRODUCT);
    }
  }
}
