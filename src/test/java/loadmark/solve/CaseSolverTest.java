package loadmark.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loadmark.equation.Equations;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.response.Circuit;
import loadmark.solve.Solutions.State;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class CaseSolverTest {
  private static final Offset<Double> TIGHT = within(1e-13);

  /** s = j, where 1 H and 1 F are at their resonance exactly. */
  private static final Frequencies ONE = Frequencies.ofS(new double[] {0}, new double[] {1});

  private static Solutions solve(Circuit circuit, Frequencies s) {
    Equations equations = equations(circuit.network());
    CaseSolver solver = new CaseSolver(equations.compare(List.of(), circuit.network().loads()));
    return solver.solve(equations.nominalValues(), s);
  }

  private static Equations equations(Network network) {
    return Equations.of(network, network.ports().get(0), false);
  }

  @Test
  void parallelResonanceOpensThePort() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.l(1)).part(1, 0, Circuit.c(1)).port(1, 0);
    Solutions found = solve(circuit.shunt(1, 0, Circuit.r(3)), ONE);
    assertThat(found.without().state(0)).isEqualTo(State.INFINITE);
    assertThat(found.with().re(0)).isCloseTo(3, TIGHT);
    assertThat(found.change().re(0)).isEqualTo(-1);
  }

  @Test
  void seriesResonanceShortsThePort() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.l(1)).part(2, 0, Circuit.c(1)).port(1, 0);
    Solutions found = solve(circuit.shunt(2, 0, Circuit.c(1)), ONE);
    assertThat(found.without().state(0)).isEqualTo(State.FINITE);
    assertThat(found.without().re(0)).isZero();
    assertThat(found.without().im(0)).isZero();
    // j − j/2
    assertThat(found.with().im(0)).isCloseTo(0.5, TIGHT);
    assertThat(found.change().state(0)).isEqualTo(State.INFINITE);
  }

  @Test
  void seriesResonanceWithinAPartIsAJoin() {
    Circuit circuit =
        new Circuit().part(1, 0, Circuit.series(Circuit.l(1), Circuit.c(1))).port(1, 0);
    Solutions found = solve(circuit.part(1, 0, Circuit.r(5)).series(1, 2, Circuit.r(3)), ONE);
    assertThat(found.without().re(0)).isZero();
    Circuit inner = new Circuit().part(1, 2, Circuit.r(2)).part(3, 0, Circuit.r(4)).port(1, 0);
    inner.part(2, 3, Circuit.series(Circuit.l(1), Circuit.c(1))).part(2, 3, Circuit.r(7));
    found = solve(inner.shunt(2, 0, Circuit.r(4)), ONE);
    assertThat(found.without().re(0)).isCloseTo(6, TIGHT);
    assertThat(found.change().re(0)).isCloseTo(4.0 / 6 - 1, TIGHT);
  }

  @Test
  void parallelResonanceWithinAPartIsAnOpen() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(5)).part(2, 0, Circuit.r(1)).port(1, 0);
    circuit.part(1, 2, Circuit.parallel(Circuit.l(1), Circuit.c(1)));
    Solutions found = solve(circuit.shunt(1, 0, Circuit.r(5)), ONE);
    assertThat(found.without().re(0)).isCloseTo(5, TIGHT);
    assertThat(found.change().re(0)).isCloseTo(-0.5, TIGHT);
  }

  @Test
  void loadAtItsOwnResonanceIsAJoinOrAnOpen() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.r(5)).part(2, 0, Circuit.r(5)).port(1, 0);
    circuit.shunt(2, 0, Circuit.series(Circuit.l(1), Circuit.c(1)));
    assertThat(solve(circuit, ONE).with().re(0)).isCloseTo(5, TIGHT);
    assertThat(solve(circuit, ONE).change().re(0)).isCloseTo(-0.5, TIGHT);
    Circuit blocked = new Circuit().part(2, 0, Circuit.r(5)).port(1, 0);
    blocked.series(1, 2, Circuit.parallel(Circuit.l(1), Circuit.c(1)));
    assertThat(solve(blocked, ONE).with().state(0)).isEqualTo(State.INFINITE);
    assertThat(solve(blocked, ONE).change().state(0)).isEqualTo(State.INFINITE);
  }

  @Test
  void innerResonanceThatThePortDoesNotFeelIsOfNoConcern() {
    // The tank between the middles of a balanced bridge carries no current.
    Circuit circuit = new Circuit().port(1, 0);
    circuit.part(1, 2, Circuit.c(1)).part(1, 3, Circuit.c(1));
    circuit.part(2, 0, Circuit.c(1)).part(3, 0, Circuit.c(1)).part(2, 3, Circuit.l(1));
    Solutions found = solve(circuit.shunt(1, 0, Circuit.c(1)), ONE);
    assertThat(found.without().im(0)).isCloseTo(-1, TIGHT);
    assertThat(found.change().re(0)).isCloseTo(-0.5, TIGHT);
  }

  @Test
  void valuesAreReplacedWithoutCompilingAnew() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.r(10)).part(2, 0, Circuit.l(2)).port(1, 0);
    circuit.part(1, 0, Circuit.series(Circuit.r(6), Circuit.c(3))).shunt(2, 0, Circuit.c(0.1));
    Equations equations = equations(circuit.network());
    assertThat(equations.nominalValues()).containsExactly(10, 2, 6, 3, 0.1);
    Circuit other = new Circuit().part(1, 2, Circuit.r(11)).part(2, 0, Circuit.l(3)).port(1, 0);
    other.part(1, 0, Circuit.series(Circuit.r(5), Circuit.c(4))).shunt(2, 0, Circuit.c(0.2));
    CaseSolver solver = new CaseSolver(equations.compare(List.of(), circuit.network().loads()));
    Solutions replaced = solver.solve(new double[] {11, 3, 5, 4, 0.2}, ONE);
    Solutions compiled = solve(other, ONE);
    assertThat(replaced.with().re(0)).isEqualTo(compiled.with().re(0));
    assertThat(replaced.change().im(0)).isEqualTo(compiled.change().im(0));
  }

  @Test
  void frequenciesMayLieAnywhereInThePlane() {
    // Z = 1/(s + 1) at s = −0.5 + 2j, and 1/(2s + 1) with the load.
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(1)).part(1, 0, Circuit.c(1)).port(1, 0);
    Frequencies s = Frequencies.ofS(new double[] {-0.5}, new double[] {2});
    Solutions found = solve(circuit.shunt(1, 0, Circuit.c(1)), s);
    assertThat(found.without().re(0)).isCloseTo(0.5 / 4.25, TIGHT);
    assertThat(found.without().im(0)).isCloseTo(-2 / 4.25, TIGHT);
    assertThat(found.with().re(0)).isCloseTo(0, TIGHT);
    assertThat(found.with().im(0)).isCloseTo(-0.25, TIGHT);
  }

  @Test
  void negativeRealFrequencyWhereAPoleIsOpensThePort() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(1)).part(1, 0, Circuit.c(1)).port(1, 0);
    Frequencies s = Frequencies.ofS(new double[] {-1}, new double[] {0});
    assertThat(solve(circuit.shunt(1, 0, Circuit.c(1)), s).without().state(0))
        .isEqualTo(State.INFINITE);
  }

  @Test
  void estimatesDoNotChangeResults() {
    Circuit circuit = new Circuit().port(1, 0);
    for (int i = 1; i < 40; i++) {
      circuit.part(i, i + 1, i % 2 == 0 ? Circuit.l(1e-6 * i) : Circuit.r(10 * i));
      circuit.part(i + 1, 0, Circuit.c(1e-10 * (1 + i % 3)));
      circuit.part(i, (i * 7 + 3) % 40, Circuit.r(1e3 * i));
    }
    circuit.shunt(40, 0, Circuit.r(75)).shunt(20, 10, Circuit.c(1e-11));
    Equations equations = equations(circuit.network());
    Frequencies s = Frequencies.ofHz(1e3, 1e5, 1e6, 3e6);
    double[] values = equations.nominalValues();
    List<Load> loads = circuit.network().loads();
    Solutions with = new CaseSolver(equations.compare(List.of(), loads)).solve(values, s);
    Solutions without = new CaseSolver(equations.compare(List.of(), loads), false).solve(values, s);
    for (int i = 0; i < s.size(); i++) {
      assertThat(without.with().re(i)).isEqualTo(with.with().re(i));
      assertThat(without.change().im(i)).isEqualTo(with.change().im(i));
      assertThat(with.change().error(i)).isLessThan(1e-10);
      assertThat(without.change().error(i)).isInfinite();
    }
  }
}
