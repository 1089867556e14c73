package loadmark.response;

import java.util.Optional;
import org.apache.commons.math3.complex.Complex;

/**
 * A lightly damped pole or zero of a port's impedance, and where a load moves it.
 *
 * @param without s in rad/s, Im s above 0, with the reference's loads; empty where the load brings
 *     it
 * @param with the same with the case's loads; empty where the load damps it out, or takes it away
 * @param followed whether it could be told from all others on the way; else {@code with} is empty
 *     and nothing is known of it
 */
public record Resonance(
    Kind kind, Optional<Complex> without, Optional<Complex> with, boolean followed) {

  /** The damping ratio −Re s/|s| from which on it is no resonance. */
  public static final double MOST_DAMPING = 0.5;

  /** Of the impedance. */
  public enum Kind {
    POLE,
    ZERO
  }

  static boolean isLight(Complex s) {
    return s.getImaginary() > 0 && damping(s) < MOST_DAMPING;
  }

  static double damping(Complex s) {
    return -s.getReal() / s.abs();
  }
}
