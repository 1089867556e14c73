package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import loadmark.network.Band;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

/** Against the closed forms of second-order circuits. */
class ResonancesTest {
  private static final Band BAND = new Band(0.01, 10);
  private static final double PERCENT = 1e-7;

  private static List<Resonance> of(Network network) {
    return Resonances.of(network, network.ports().get(0), network.loads(), List.of(), BAND);
  }

  /** A tank of 1 H, 1 F and a resistor across it. */
  private static Sketch tank(double ohm) {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    return sketch
        .inductor(in, sketch.ground(), 1)
        .capacitor(in, sketch.ground(), 1)
        .resistor(in, sketch.ground(), ohm);
  }

  private static Network loaded(Sketch sketch, ElementKind kind, double value) {
    OnePort load = OnePort.of(kind, value);
    return sketch.shunt(new Node(1, "n1"), sketch.ground(), load).network();
  }

  @Test
  void aCapacitorMovesThePoleOfATank() {
    List<Resonance> found = of(loaded(tank(1000), ElementKind.CAPACITANCE, 1e-4));
    assertThat(found).hasSize(1);
    Resonance pole = found.get(0);
    assertThat(pole.kind()).isEqualTo(Resonance.Kind.POLE);
    assertThat(pole.followed()).isTrue();
    // |s|² = 1/(LC) for the two roots of s²LC + sL/R + 1.
    assertThat(pole.without().orElseThrow().abs()).isCloseTo(1, withinPercentage(PERCENT));
    double with = 1 / Math.sqrt(1 + 1e-4);
    assertThat(pole.with().orElseThrow().abs()).isCloseTo(with, withinPercentage(PERCENT));
  }

  @Test
  void aHeavyCapacitorIsFollowedOverDecades() {
    Resonance pole = of(loaded(tank(1000), ElementKind.CAPACITANCE, 100)).get(0);
    double with = 1 / Math.sqrt(101);
    assertThat(pole.with().orElseThrow().abs()).isCloseTo(with, withinPercentage(PERCENT));
  }

  @Test
  void aResistorDampsATankOut() {
    List<Resonance> found = of(loaded(tank(1000), ElementKind.RESISTANCE, 0.3));
    assertThat(found).hasSize(1);
    assertThat(found.get(0).without()).isPresent();
    assertThat(found.get(0).with()).isEmpty();
    assertThat(found.get(0).followed()).isTrue();
  }

  @Test
  void anInductorBringsAResonance() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    sketch.capacitor(in, sketch.ground(), 1).resistor(in, sketch.ground(), 1000);
    List<Resonance> found = of(loaded(sketch, ElementKind.INDUCTANCE, 1));
    assertThat(found).hasSize(1);
    assertThat(found.get(0).without()).isEmpty();
    assertThat(found.get(0).with().orElseThrow().abs()).isCloseTo(1, withinPercentage(PERCENT));
  }

  @Test
  void aSeriesResonatorThatPassesATankPushesItAside() {
    // The load's own resonance at 1.01 rad/s enters as a pole and a zero that cancel; the tank's
    // pole is pushed down, the load's up, and neither takes the other's place.
    Sketch sketch = tank(1e5);
    OnePort load =
        OnePort.series(
            List.of(
                OnePort.of(ElementKind.INDUCTANCE, 100 / 1.0201),
                OnePort.of(ElementKind.CAPACITANCE, 0.01)));
    List<Resonance> found = of(sketch.shunt(new Node(1, "n1"), sketch.ground(), load).network());
    // Lossless: (1 − w)(1 − w/1.0201) = 0.01·w for w = ω².
    double b = 1 + 1.0201 + 0.01 * 1.0201;
    double root = Math.sqrt(b * b - 4 * 1.0201);
    Resonance followed =
        found.stream()
            .filter(r -> r.kind() == Resonance.Kind.POLE && r.without().isPresent())
            .findFirst()
            .orElseThrow();
    Complex with = followed.with().orElseThrow();
    assertThat(with.abs() * with.abs()).isCloseTo((b - root) / 2, withinPercentage(1e-2));
    assertThat(found)
        .filteredOn(r -> r.without().isEmpty())
        .extracting(Resonance::kind)
        .containsExactlyInAnyOrder(Resonance.Kind.POLE, Resonance.Kind.ZERO);
  }
}
