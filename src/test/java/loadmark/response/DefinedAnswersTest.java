package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apfloat.Apcomplex;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

/** Answers at DC, at resonances, for opens and joins, and where numbers leave their range. */
class DefinedAnswersTest {
  private static final Offset<Double> TIGHT = within(1e-12);

  @Test
  void inductorsAreJoinedAndCapacitorsOpenAtDc() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.l(1)).part(2, 0, Circuit.r(10)).port(1, 0);
    circuit.part(2, 3, Circuit.c(1)).part(3, 0, Circuit.r(1)).part(2, 0, Circuit.r(40));
    circuit.part(3, 0, Circuit.l(1)).shunt(2, 3, Circuit.r(8));
    Loading at = circuit.compare().at(0);
    assertThat(at.without().re()).isCloseTo(8, TIGHT);
    assertThat(at.without().im()).isZero();
    assertThat(at.change().re()).isCloseTo(-0.5, TIGHT);
  }

  @Test
  void openPortThatALoadClosesChangesByOne() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.c(1e-6)).port(1, 0);
    Loading at = circuit.shunt(1, 0, Circuit.r(5)).compare().at(0);
    assertThat(at.without().isOpen()).isTrue();
    assertThat(at.with().re()).isCloseTo(5, TIGHT);
    assertThat(at.change()).isEqualTo(Change.of(-1, 0));
    assertThat(at.withoutError()).isZero();
  }

  @Test
  void loadThatOpensThePortIsUnbounded() {
    Circuit circuit = new Circuit().part(2, 0, Circuit.r(5)).port(1, 0);
    Loading at = circuit.series(1, 2, Circuit.c(1e-6)).compare().at(0);
    assertThat(at.without().re()).isCloseTo(5, TIGHT);
    assertThat(at.with().isOpen()).isTrue();
    assertThat(at.change().isUnbounded()).isTrue();
  }

  @Test
  void changeFromZeroIsUnbounded() {
    Circuit circuit = new Circuit().part(2, 0, Circuit.l(5)).port(1, 0);
    Loading at = circuit.series(1, 2, Circuit.r(1)).compare().at(0);
    assertThat(at.without().isZero()).isTrue();
    assertThat(at.with().re()).isCloseTo(1, TIGHT);
    assertThat(at.change().isUnbounded()).isTrue();
  }

  @Test
  void loadThatShortsThePortTakesAllAway() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(5)).port(1, 0);
    Loading at = circuit.shunt(1, 0, Circuit.l(1)).compare().at(0);
    assertThat(at.with().isZero()).isTrue();
    assertThat(at.change()).isEqualTo(Change.of(-1, 0));
  }

  @Test
  void zeroAgainstZeroAndOpenAgainstOpenAreUndetermined() {
    Circuit zero = new Circuit().part(1, 0, Circuit.l(5)).port(1, 0).shunt(1, 0, Circuit.r(1));
    assertThat(zero.compare().at(0).change().isUndetermined()).isTrue();
    assertThat(zero.compare(zero.loads(), zero.loads()).at(0).change().isUndetermined()).isTrue();
    Circuit open = new Circuit().part(1, 0, Circuit.c(5)).port(1, 0).shunt(1, 0, Circuit.c(1));
    assertThat(open.compare().at(0).change().isUndetermined()).isTrue();
    assertThat(open.compare(open.loads(), open.loads()).at(0).change().isUndetermined()).isTrue();
  }

  @Test
  void islandsAtDcAreOfNoConcern() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(5)).port(1, 0);
    circuit.part(1, 2, Circuit.c(1e-9)).part(2, 3, Circuit.r(1)).part(2, 3, Circuit.r(2));
    circuit.part(3, 4, Circuit.c(1e-9)).part(4, 0, Circuit.r(1)).shunt(2, 3, Circuit.r(1));
    Loading at = circuit.compare().at(0);
    assertThat(at.without().re()).isCloseTo(5, TIGHT);
    assertThat(at.change()).isEqualTo(Change.NONE);
  }

  @Test
  void losslessIslandIsOfNoConcernAtItsResonance() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(5)).port(1, 0).part(1, 2, Circuit.r(1));
    circuit.part(2, 3, Circuit.l(1e-6)).part(2, 3, Circuit.c(1e-6)).part(3, 4, Circuit.c(1e-6));
    circuit.part(4, 2, Circuit.l(1e-6));
    Loading at = circuit.compare().at(1e6 / (2 * Math.PI));
    assertThat(at.without().re()).isCloseTo(5, TIGHT);
  }

  /** 2πf rounds to the resonance as nearly as doubles can; the answer is that of f as it stands. */
  @Test
  void portNextToALosslessResonanceIsRight() {
    double hz = 1 / (2 * Math.PI * Math.sqrt(1e-3 * 1e-6));
    Circuit tank = new Circuit().part(1, 0, Circuit.l(1e-3)).part(1, 0, Circuit.c(1e-6)).port(1, 0);
    tank.shunt(1, 0, Circuit.r(1e6));
    Circuit trap = new Circuit().part(1, 2, Circuit.l(1e-3)).part(2, 0, Circuit.c(1e-6)).port(1, 0);
    trap.series(1, 3, Circuit.r(1e-6)).part(3, 0, Circuit.r(50));
    for (Circuit circuit : new Circuit[] {tank, trap}) {
      Loading at = circuit.compare().at(hz);
      Apcomplex exact = new ExactNetwork(circuit.network(), List.of(), hz).solve();
      double error = ExactNetwork.error(exact, at.without().re(), at.without().im());
      assertThat(error).isLessThanOrEqualTo(at.withoutError()).isLessThan(1e-12);
    }
    assertThat(tank.compare().at(hz).without().magnitude()).isGreaterThan(1e15);
    assertThat(tank.compare().at(hz).change().re()).isCloseTo(-1, within(1e-6));
  }

  @Test
  void whatLeavesTheRangeIsUndetermined() {
    Circuit huge = new Circuit().part(1, 2, Circuit.r(1e200)).part(2, 0, Circuit.r(1)).port(1, 0);
    assertThat(huge.compare().at(50).without().isUndetermined()).isTrue();
    Circuit tiny = new Circuit().part(1, 0, Circuit.c(1e-250)).port(1, 0);
    Loading at = tiny.shunt(1, 0, Circuit.r(1)).compare().at(50);
    assertThat(at.without().isUndetermined()).isTrue();
    assertThat(at.change().isUndetermined()).isTrue();
    assertThat(at.withoutError()).isInfinite();
  }

  @Test
  void loadBehindThousandsOfDecibelsChangesNothingOfKnownSize() {
    Circuit circuit = new Circuit().port(1, 0);
    for (int i = 1; i <= 500; i++) {
      circuit.part(i, i + 1, Circuit.r(1e3)).part(i + 1, 0, Circuit.r(10));
    }
    Loading at = circuit.shunt(501, 0, Circuit.r(1e3)).compare().at(1e3);
    assertThat(at.without().isFinite()).isTrue();
    assertThat(at.change()).isEqualTo(Change.NONE);
    assertThat(at.changeError()).isInfinite();
  }
}
