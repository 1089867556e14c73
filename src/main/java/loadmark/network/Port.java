package loadmark.network;

/**
 * A pair of nodes whose driving-point impedance is judged.
 *
 * @param closure what closes it while another port is judged; taken off while it is judged itself
 */
public record Port(String name, Node plus, Node minus, Closure closure, int line) {

  /** What stands across a port that is not judged. */
  public sealed interface Closure {
    /** Nothing. */
    record Open() implements Closure {}

    /** A fixed termination. */
    record Terminated(OnePort value) implements Closure {}

    /** A voltage at zero behind nothing: a short. */
    record Shorted(Drive drive) implements Closure {}

    /** A voltage at zero behind an impedance. */
    record Driven(Drive drive, OnePort behind) implements Closure {}
  }

  /**
   * The voltage of a drive, used for levels.
   *
   * @param volts as written: r.m.s., peak or dc as {@code kind} says
   */
  public record Drive(double volts, DriveKind kind, boolean mains) {}

  /** How a drive's voltage is meant. */
  public enum DriveKind {
    RMS,
    PEAK,
    DC
  }
}
