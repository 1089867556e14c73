package loadmark.equation;

/**
 * One ideal two-terminal of a circuit.
 *
 * @param from the node where its current enters; its voltage is that of {@code from} against {@code
 *     to}
 * @param value Ω, H or F; 0 for the two kinds without a value
 */
public record CircuitBranch(Kind kind, int from, int to, double value) {

  /** What it is. */
  public enum Kind {
    RESISTOR,
    INDUCTOR,
    CAPACITOR,
    /** A voltage that is given, 0 V at rest: an ammeter or a voltage source. */
    SHORT,
    /** A current that is given, 0 A at rest: a voltmeter or a current source. */
    OPEN;

    /** Whether it stores energy. */
    public boolean isReactive() {
      return this == INDUCTOR || this == CAPACITOR;
    }
  }

  /** Its impedance in Ω at a real complex frequency {@code s} (rad/s), above 0. */
  public double resistance(double s) {
    return switch (kind) {
      case RESISTOR -> value;
      case INDUCTOR -> s * value;
      case CAPACITOR -> 1 / (s * value);
      case SHORT -> 0;
      case OPEN -> Double.POSITIVE_INFINITY;
    };
  }
}
