package loadmark.equation;

import java.util.List;

/**
 * A part that no branch admittance describes: the currents of its ports are unknowns, and there are
 * as many equations as ports, Σ a·V + b·I = 0 over the ports' voltages (V) and the currents that
 * flow into their first nodes (A).
 *
 * @param ports its pairs of nodes
 * @param equations what fills the coefficients
 */
public record Constraint(List<Terminals> ports, Coefficients equations) {

  /** A pair of nodes. */
  public record Terminals(int first, int second) {}

  /** The coefficients of a part's equations as functions of s. */
  @FunctionalInterface
  public interface Coefficients {
    /**
     * Writes the coefficients at s = re + j·im, rad/s.
     *
     * @param voltage ports × ports complex numbers, row-major by equation, re and im in turn
     * @param current the same for the currents
     */
    void at(double re, double im, double[] voltage, double[] current);
  }

  public Constraint {
    ports = List.copyOf(ports);
  }
}
