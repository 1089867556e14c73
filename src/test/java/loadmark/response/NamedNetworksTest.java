package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loadmark.network.Load;
import org.apfloat.Apcomplex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Networks that are hard on one method of solution or another. */
class NamedNetworksTest {
  private static final double UNIT = 0x1p-53;

  /** What is promised of Z, in units of κ·2⁻⁵³, and of the change. */
  private static final double BOUND = 1000 * UNIT;

  /** Closed forms are asserted to about this; they are evaluated in a few roundings. */
  private static final double TIGHT = 1e-14;

  /**
   * With ω² = 2/LC every inner node of the ladder is at its own resonance, which the port does not
   * show.
   */
  @ParameterizedTest
  @CsvSource({
    "4, 0", "4, 1e-9", "4, -1e-9", "4, 1e-6", "4, -1e-6",
    "10, 0", "10, 1e-9", "10, -1e-9", "10, 1e-6", "10, -1e-6",
    "60, 0", "60, 1e-9", "60, -1e-9", "60, 1e-6", "60, -1e-6"
  })
  void equalLadderIsRightAtTheResonanceOfItsInnerNodes(int sections, double delta) {
    double l = 1e-6;
    double c = 1e-9;
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(Math.sqrt(l / c)));
    for (int i = 1; i <= sections; i++) {
      circuit.part(i, i + 1, Circuit.l(l)).part(i, 0, Circuit.c(c));
    }
    int end = sections + 1;
    circuit.part(end, 0, Circuit.r(Math.sqrt(l / c))).port(1, 0).shunt(end, 0, Circuit.c(1e-15));
    check(circuit, Math.sqrt(2 / (l * c)) * (1 + delta) / (2 * Math.PI));
  }

  @Test
  void milliohmsBesideATeraohm() {
    Circuit circuit =
        new Circuit()
            .part(1, 2, Circuit.r(0.01))
            .part(2, 0, Circuit.r(1e12))
            .port(1, 0)
            .shunt(2, 0, Circuit.r(1e12));
    Loading at = check(circuit, 50);
    assertThat(at.change().re()).isCloseTo(-0.5 * (1 - 1e-14), within(TIGHT));
  }

  @Test
  void femtofaradLoadOnAMicrofarad() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.c(1e-6)).port(1, 0);
    circuit.shunt(1, 0, Circuit.c(1e-15));
    Loading at = check(circuit, 1e3);
    // C/(C + ΔC) − 1
    assertThat(at.change().re() / (-1e-15 / (1e-6 + 1e-15))).isCloseTo(1, within(TIGHT));
  }

  @Test
  void femtofaradBesideALoadThatIsOn() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(1e3)).port(1, 0);
    circuit.shunt(1, 0, Circuit.c(1e-6)).shunt(1, 0, Circuit.c(1e-15));
    Comparison added = circuit.compare(circuit.loads(0, 1), circuit.loads(0));
    check(circuit, added.at(1e3), circuit.loads(0, 1), circuit.loads(0));
  }

  @Test
  void twoLoadsJoinedByAMilliohmWithATeraohmToCommon() {
    Circuit circuit =
        new Circuit().part(1, 2, Circuit.r(1e-3)).part(1, 0, Circuit.r(1e12)).port(1, 0);
    circuit.shunt(1, 0, Circuit.r(50)).shunt(2, 0, Circuit.r(50));
    check(circuit, 1e3);
    Circuit floating =
        new Circuit().part(1, 2, Circuit.r(1e-3)).part(1, 0, Circuit.r(1e12)).port(3, 4);
    floating.part(3, 4, Circuit.r(1e3)).shunt(3, 1, Circuit.r(50)).shunt(2, 4, Circuit.r(50));
    Comparison second = floating.compare(floating.loads(0, 1), floating.loads(0));
    check(floating, second.at(1e3), floating.loads(0, 1), floating.loads(0));
  }

  @Test
  void balancedBridgeDoesNotFeelItsLoad() {
    Circuit circuit =
        new Circuit()
            .part(1, 2, Circuit.r(100))
            .part(1, 3, Circuit.r(200))
            .part(2, 0, Circuit.r(300))
            .part(3, 0, Circuit.r(600))
            .port(1, 0)
            .shunt(2, 3, Circuit.r(50));
    Loading at = circuit.compare().at(1e3);
    // 400 Ω beside 800 Ω
    assertThat(at.without().re()).isCloseTo(800.0 / 3, within(800 * UNIT));
    assertThat(at.with().re()).isCloseTo(800.0 / 3, within(800 * UNIT));
    assertThat(at.change()).isEqualTo(Change.NONE);
  }

  @Test
  void nearlyBalancedBridgeIsRight() {
    Circuit circuit =
        new Circuit()
            .part(1, 2, Circuit.r(100))
            .part(1, 3, Circuit.r(200))
            .part(2, 0, Circuit.r(300))
            .part(3, 0, Circuit.r(600.0001))
            .port(1, 0)
            .shunt(2, 3, Circuit.r(50));
    check(circuit, 1e3);
  }

  @Test
  void ladderWhoseFarEndIs300DecibelsDown() {
    Circuit circuit = new Circuit().port(1, 0);
    for (int i = 1; i <= 100; i++) {
      circuit.part(i, i + 1, Circuit.r(1e3)).part(i + 1, 0, Circuit.r(8.2e3));
    }
    circuit.shunt(101, 0, Circuit.r(1e3));
    Loading at = check(circuit, 1e3);
    // The change is the square of the voltage ratio, within a factor.
    assertThat(10 * Math.log10(at.change().magnitude())).isBetween(-320.0, -280.0);
  }

  private static Loading check(Circuit circuit, double hz) {
    Loading at = circuit.compare().at(hz);
    check(circuit, at, circuit.network().loads(), List.of());
    return at;
  }

  private static void check(Circuit circuit, Loading at, List<Load> with, List<Load> without) {
    ExactNetwork bare = new ExactNetwork(circuit.network(), without, at.hz());
    ExactNetwork loaded = new ExactNetwork(circuit.network(), with, at.hz());
    Apcomplex z = bare.solve();
    Apcomplex loadedZ = loaded.solve();
    double error = ExactNetwork.error(z, at.without().re(), at.without().im());
    assertThat(error).isLessThanOrEqualTo(BOUND * bare.condition(z));
    assertThat(error).isLessThanOrEqualTo(at.withoutError());
    error = ExactNetwork.error(loadedZ, at.with().re(), at.with().im());
    assertThat(error).isLessThanOrEqualTo(BOUND * loaded.condition(loadedZ));
    assertThat(error).isLessThanOrEqualTo(at.withError());
    Apcomplex change = loadedZ.divide(z).subtract(Apcomplex.ONE);
    error = ExactNetwork.error(change, at.change().re(), at.change().im());
    assertThat(error).isLessThanOrEqualTo(1e-12).isLessThanOrEqualTo(at.changeError());
  }
}
