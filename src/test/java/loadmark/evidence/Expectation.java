package loadmark.evidence;

import java.util.Set;

/**
 * What one limit must come to in one case at one port of an example.
 *
 * @param seen the impedance at a port with some loads on
 * @param which among the limits of that kind in the case, from 0
 * @param kept whether the example is meant to keep it
 * @param fromHz lowest frequency of the scope
 * @param toHz highest frequency of the scope
 */
record Expectation(
    String example,
    Seen seen,
    String caseName,
    String port,
    Set<String> loads,
    Set<String> against,
    int which,
    boolean kept,
    double fromHz,
    double toHz,
    Measure measure) {

  /** Impedance (Ω) at a port, with the named loads on, at a frequency in Hz. */
  interface Seen {
    org.apache.commons.math3.complex.Complex z(String port, Set<String> on, double hz);
  }

  double strain(double hz) {
    return measure.strain().of(seen.z(port, loads, hz), seen.z(port, against, hz), hz);
  }

  double value(double hz) {
    return measure.value().of(seen.z(port, loads, hz), seen.z(port, against, hz), hz);
  }

  @Override
  public String toString() {
    return "%s: %s at %s, %s %d".formatted(example, caseName, port, measure.kind(), which);
  }
}
