package loadmark.response;

import loadmark.network.Network;
import loadmark.network.Node;

/**
 * Z = (2s⁴ + 4s² + 1)/(2s³ + 2s) in Foster's first form (Foster, A Reactance Theorem, Bell Syst.
 * Tech. J. 3, 1924): an inductor of 1 H, a capacitor of 2 F and a tank of 2 F and ½ H in series.
 */
final class FosterExample {
  static final double FIRST_ZERO = Math.sqrt(1 - Math.sqrt(0.5));
  static final double SECOND_ZERO = Math.sqrt(1 + Math.sqrt(0.5));

  /** (2·0.3⁴ − 4·0.3² + 1)/(2·0.3 − 2·0.3³). */
  static final double MAGNITUDE_AT_0_3 = 0.6562 / 0.546;

  private FosterExample() {}

  static Network network() {
    Sketch sketch = new Sketch();
    Node in = sketch.node();
    Node a = sketch.node();
    Node b = sketch.node();
    return sketch
        .inductor(in, a, 1)
        .capacitor(a, b, 2)
        .capacitor(b, sketch.ground(), 2)
        .inductor(b, sketch.ground(), 0.5)
        .network();
  }
}
