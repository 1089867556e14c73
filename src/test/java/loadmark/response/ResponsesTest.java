package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Part;
import loadmark.network.Port;
import org.junit.jupiter.api.Test;

class ResponsesTest {
  private static final Node GROUND = new Node(0, "ground");
  private static final Node IN = new Node(1, "in");
  private static final Node TAP = new Node(2, "tap");
  private static final Port PORT = new Port("input", IN, GROUND, new Port.Closure.Open(), 1);

  private static Part resistor(String name, Node a, Node b, double ohm) {
    OnePort value = OnePort.of(ElementKind.RESISTANCE, ohm);
    return new Part(name, "resistor", a, b, value, "", OptionalDouble.empty(), 1);
  }

  private static Load load(Load.Placement placement, Node a, Node b, double ohm) {
    return new Load(
        "load", placement, a, b, OnePort.of(ElementKind.RESISTANCE, ohm), ohm + " Ω", 1);
  }

  private static Network network(List<Part> parts, Load load) {
    return new Network(
        "",
        List.of(GROUND, IN, TAP),
        parts,
        List.of(),
        List.of(PORT),
        List.of(load),
        List.of(),
        List.of(),
        Optional.empty());
  }

  @Test
  void shuntLoadAbsentMeansOpen() {
    Load load = load(Load.Placement.SHUNT, TAP, GROUND, 30);
    Network network =
        network(List.of(resistor("a", IN, TAP, 10), resistor("b", TAP, GROUND, 60)), load);
    Loading at =
        Responses.of(network, PORT).compare(List.of(load), List.of()).at(new double[] {0}).get(0);
    assertThat(at.without().re()).isCloseTo(70, within(1e-12));
    assertThat(at.with().re()).isCloseTo(30, within(1e-12));
    assertThat(at.change().re()).isCloseTo(30.0 / 70 - 1, within(1e-14));
  }

  @Test
  void seriesLoadAbsentMeansJoined() {
    Load load = load(Load.Placement.SERIES, IN, TAP, 30);
    Network network = network(List.of(resistor("b", TAP, GROUND, 60)), load);
    Loading at = Responses.of(network, PORT).compare(List.of(load), List.of()).at(50);
    assertThat(at.without().re()).isCloseTo(60, within(1e-12));
    assertThat(at.with().re()).isCloseTo(90, within(1e-12));
  }
}
