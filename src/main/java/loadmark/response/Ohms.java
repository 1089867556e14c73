package loadmark.response;

/**
 * A driving-point impedance, or what stands in its place.
 *
 * @param re real part, Ω; 0 unless finite
 * @param im imaginary part, Ω; 0 unless finite
 */
public record Ohms(State state, double re, double im) {
  public static final Ohms OPEN = new Ohms(State.OPEN, 0, 0);
  public static final Ohms UNDETERMINED = new Ohms(State.UNDETERMINED, 0, 0);

  /** What is known of the impedance. */
  public enum State {
    FINITE,
    /** No current flows whatever the voltage. */
    OPEN,
    /** The equations had no answer that can be trusted. */
    UNDETERMINED
  }

  public Ohms {
    if (!Double.isFinite(re) || !Double.isFinite(im)) {
      throw new IllegalArgumentException(re + " + j" + im);
    }
  }

  public static Ohms of(double re, double im) {
    return new Ohms(State.FINITE, re, im);
  }

  public boolean isFinite() {
    return state == State.FINITE;
  }

  public boolean isOpen() {
    return state == State.OPEN;
  }

  public boolean isUndetermined() {
    return state == State.UNDETERMINED;
  }

  public boolean isZero() {
    return isFinite() && re == 0 && im == 0;
  }

  /** |Z|, Ω; infinite where open. */
  public double magnitude() {
    return isOpen() ? Double.POSITIVE_INFINITY : Math.hypot(re, im);
  }

  /** The phase of a finite Z, degrees, in (−180, 180]. */
  public double phaseDegrees() {
    double degrees = Math.toDegrees(Math.atan2(im, re));
    return degrees == -180 ? 180 : degrees;
  }
}
