package loadmark.response;

/**
 * The relative change Z_with/Z_without − 1, a complex number that is computed as such and never as
 * a difference of two impedances.
 *
 * @param re 0 unless finite
 * @param im 0 unless finite
 */
public record Change(State state, double re, double im) {
  public static final Change NONE = new Change(State.FINITE, 0, 0);
  public static final Change UNBOUNDED = new Change(State.UNBOUNDED, 0, 0);
  public static final Change UNDETERMINED = new Change(State.UNDETERMINED, 0, 0);

  /** What is known of the change. */
  public enum State {
    FINITE,
    /** Z_without is 0 and Z_with is not, or Z_with alone is open. */
    UNBOUNDED,
    /** 0/0, ∞/∞, or an impedance that is undetermined. */
    UNDETERMINED
  }

  public Change {
    if (!Double.isFinite(re) || !Double.isFinite(im)) {
      throw new IllegalArgumentException(re + " + j" + im);
    }
  }

  public static Change of(double re, double im) {
    return new Change(State.FINITE, re, im);
  }

  public boolean isFinite() {
    return state == State.FINITE;
  }

  public boolean isUnbounded() {
    return state == State.UNBOUNDED;
  }

  public boolean isUndetermined() {
    return state == State.UNDETERMINED;
  }

  /** |Z_with/Z_without − 1|; infinite where unbounded. */
  public double magnitude() {
    return isUnbounded() ? Double.POSITIVE_INFINITY : Math.hypot(re, im);
  }
}
