package loadmark.allowance;

/**
 * How much of something a limit leaves room for.
 *
 * @param value in the unit of what is asked for; 0 unless it is a number
 */
public record Amount(State state, double value) {
  public static final Amount ANY = new Amount(State.ANY, 0);
  public static final Amount NONE = new Amount(State.NONE, 0);
  public static final Amount UNDETERMINED = new Amount(State.UNDETERMINED, 0);

  /** What is known of the amount. */
  public enum State {
    NUMBER,
    /** However heavy the load, no limit is broken. */
    ANY,
    /** A limit is broken without the load, or by any load however light. */
    NONE,
    /** The network itself has no answer there: 0/0, ∞/∞, or equations that could not be solved. */
    UNDETERMINED
  }

  public Amount {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("an amount of " + value);
    }
  }

  public static Amount of(double value) {
    return new Amount(State.NUMBER, value);
  }

  public boolean isNumber() {
    return state == State.NUMBER;
  }
}
