package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loadmark.network.Port;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

/** What a network with its loads means. The values are series and parallel sums. */
class ResponsesTest {
  private static final Offset<Double> TIGHT = within(1e-12);

  @Test
  void shuntLoadAbsentMeansOpen() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.r(10)).part(2, 0, Circuit.r(60)).port(1, 0);
    Loading at = circuit.shunt(2, 0, Circuit.r(30)).compare().at(50);
    assertThat(at.without().re()).isCloseTo(70, TIGHT);
    assertThat(at.with().re()).isCloseTo(30, TIGHT);
    assertThat(at.change().re()).isCloseTo(30.0 / 70 - 1, TIGHT);
  }

  @Test
  void seriesLoadAbsentMeansJoined() {
    Circuit circuit = new Circuit().part(2, 0, Circuit.r(60)).port(1, 0);
    Loading at = circuit.series(1, 2, Circuit.r(30)).compare().at(50);
    assertThat(at.without().re()).isCloseTo(60, TIGHT);
    assertThat(at.with().re()).isCloseTo(90, TIGHT);
    assertThat(at.change().re()).isCloseTo(0.5, TIGHT);
  }

  @Test
  void seriesLoadsOfOnePlaceStandInSeries() {
    Circuit circuit = new Circuit().part(2, 0, Circuit.r(60)).port(1, 0);
    circuit.series(1, 2, Circuit.r(30)).series(2, 1, Circuit.r(6));
    assertThat(circuit.compare().at(50).with().re()).isCloseTo(96, TIGHT);
    Loading added = circuit.compare(circuit.loads(0, 1), circuit.loads(0)).at(50);
    assertThat(added.without().re()).isCloseTo(90, TIGHT);
    assertThat(added.change().re()).isCloseTo(6.0 / 90, TIGHT);
  }

  @Test
  void oneLoadInsteadOfAnother() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(100)).port(1, 0);
    circuit.shunt(1, 0, Circuit.r(100)).shunt(1, 0, Circuit.r(25));
    Loading at = circuit.compare(circuit.loads(1), circuit.loads(0)).at(50);
    assertThat(at.without().re()).isCloseTo(50, TIGHT);
    assertThat(at.with().re()).isCloseTo(20, TIGHT);
    assertThat(at.change().re()).isCloseTo(-0.6, TIGHT);
  }

  @Test
  void sameLoadsOnBothSidesChangeNothing() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(100)).port(1, 0);
    circuit.shunt(1, 0, Circuit.r(100));
    Loading at = circuit.compare(circuit.loads(0), circuit.loads(0)).at(50);
    assertThat(at.with().re()).isCloseTo(50, TIGHT);
    assertThat(at.change()).isEqualTo(Change.NONE);
    assertThat(circuit.compare(List.of(), List.of()).at(0).change()).isEqualTo(Change.NONE);
  }

  @Test
  void loadThatCanCarryNoCurrentChangesNothing() {
    Circuit circuit = new Circuit().part(1, 0, Circuit.r(100)).part(1, 2, Circuit.r(7)).port(1, 0);
    circuit.part(2, 3, Circuit.c(1e-9)).shunt(2, 3, Circuit.l(1e-3));
    Loading at = circuit.compare().at(50);
    assertThat(at.with().re()).isCloseTo(100, TIGHT);
    assertThat(at.change()).isEqualTo(Change.NONE);
  }

  @Test
  void judgedPortsClosureIsOffAndEveryOtherPortIsClosed() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.r(10)).part(2, 0, Circuit.r(40));
    circuit.part(2, 3, Circuit.r(20)).part(3, 4, Circuit.r(5)).part(2, 5, Circuit.r(6));
    Port.Drive drive = new Port.Drive(1, Port.DriveKind.RMS, false);
    circuit.port(1, 0, new Port.Closure.Terminated(Circuit.r(1)));
    circuit.port(3, 0, new Port.Closure.Driven(drive, Circuit.r(20)));
    circuit.port(4, 0, new Port.Closure.Open());
    assertThat(circuit.compare().at(50).without().re()).isCloseTo(30, TIGHT);
    circuit.port(5, 0, new Port.Closure.Shorted(drive));
    // 10 + 40 ∥ 40 ∥ 6
    assertThat(circuit.compare().at(50).without().re()).isCloseTo(10 + 60.0 / 13, TIGHT);
    circuit.port(2, 0, new Port.Closure.Terminated(Circuit.r(60)));
    assertThat(circuit.compare().at(50).without().re()).isCloseTo(10 + 30.0 / 7, TIGHT);
  }

  @Test
  void supplyIsCommonForImpedances() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.r(10)).part(1, 3, Circuit.r(30)).port(1, 0);
    circuit.supply(2, Optional.empty()).supply(3, Optional.of(Circuit.r(10)));
    assertThat(circuit.compare().at(50).without().re()).isCloseTo(8, TIGHT);
  }

  @Test
  void zeroOhmsIsALink() {
    Circuit circuit = new Circuit().part(1, 2, Circuit.r(0)).part(2, 0, Circuit.r(10)).port(1, 0);
    circuit.part(2, 3, Circuit.series(Circuit.r(0), Circuit.r(0))).part(3, 0, Circuit.r(10));
    assertThat(circuit.compare().at(50).without().re()).isCloseTo(5, TIGHT);
    circuit.part(1, 0, Circuit.parallel(Circuit.r(0), Circuit.r(5)));
    assertThat(circuit.compare().at(50).without().isZero()).isTrue();
  }

  @Test
  void pointsComeBackInTheirOrderWithDcAmongThem() {
    Circuit circuit =
        new Circuit().part(1, 0, Circuit.r(10)).part(1, 0, Circuit.c(1e-6)).port(1, 0);
    double[] hz = {1e6, 0, 10, 0, 1e3};
    List<Loading> at = circuit.compare().at(hz);
    for (int i = 0; i < hz.length; i++) {
      assertThat(at.get(i)).isEqualTo(circuit.compare().at(hz[i]));
      assertThat(at.get(i).hz()).isEqualTo(hz[i]);
    }
  }

  @Test
  void whatIsNoFrequencyIsRefused() {
    Comparison compared = new Circuit().part(1, 0, Circuit.r(10)).port(1, 0).compare();
    assertThatThrownBy(() -> compared.at(-1)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> compared.at(Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> compared.at(Double.POSITIVE_INFINITY))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
