package loadmark.response;

import java.util.List;
import java.util.Random;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;

/** One to eight resonators of Q 1e3 to 1e6 along a resistive line, a light load inside one. */
final class ResonatorNetworks {
  private ResonatorNetworks() {}

  static Network of(long seed) {
    Random random = new Random(seed);
    Sketch sketch = new Sketch();
    Node at = sketch.node();
    Node tap = at;
    int count = 1 + random.nextInt(8);
    for (int i = 0; i < count; i++) {
      if (random.nextBoolean()) {
        Node next = sketch.node();
        sketch.resistor(at, next, decades(random, 0, 4));
        at = next;
      }
      double omega = 2 * Math.PI * decades(random, 5, 7);
      double q = decades(random, 3, 6);
      double ohm = decades(random, 1, 4);
      Node inner = sketch.node();
      Node last = sketch.node();
      if (random.nextInt(3) > 0) {
        sketch.inductor(at, inner, ohm / omega);
        sketch.capacitor(inner, last, 1 / (ohm * omega));
        sketch.resistor(last, sketch.ground(), ohm / q);
      } else {
        sketch.capacitor(at, inner, 1 / (ohm * omega * (1 + 10 * random.nextDouble())));
        sketch.resistor(inner, last, 1 + random.nextDouble());
        sketch.inductor(last, sketch.ground(), ohm / omega);
        sketch.capacitor(last, sketch.ground(), 1 / (ohm * omega));
        sketch.resistor(last, sketch.ground(), ohm * q);
      }
      if (random.nextInt(count) == 0) {
        tap = inner;
      }
    }
    sketch.resistor(at, sketch.ground(), decades(random, 0, 4));
    OnePort load =
        OnePort.parallel(
            List.of(
                OnePort.of(ElementKind.RESISTANCE, decades(random, 6, 8)),
                OnePort.of(ElementKind.CAPACITANCE, decades(random, -14, -12))));
    return sketch.shunt(tap, sketch.ground(), load).network();
  }

  private static double decades(Random random, double from, double to) {
    return Math.pow(10, from + (to - from) * random.nextDouble());
  }
}
