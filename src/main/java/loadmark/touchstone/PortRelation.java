package loadmark.touchstone;

import java.util.Optional;

/**
 * How the ports' voltages and currents go together at one frequency: A·V = B·I, V in V, I in A into
 * the ports. The rows of (A, B) are independent, whatever the data: an open, a short and a through
 * have this form, though they lack an impedance matrix, an admittance matrix, or both. A row can
 * stand as it is in a system of equations that has the currents among its unknowns.
 *
 * @param voltage A: plain numbers from S and Z data, S from Y data
 * @param current B: Ω from S and Z data, plain numbers from Y data
 */
public record PortRelation(Matrix voltage, Matrix current) {

  /** How many ports: 1 or 2. */
  public int ports() {
    return voltage.ports();
  }

  /**
   * The impedance matrix A⁻¹·B, Ω; of Z data, exactly the data. Empty where there is none: an open
   * port, two ports that only pass current on (as far as rounding can tell), an entry beyond
   * doubles.
   */
  public Optional<Matrix> findImpedance() {
    return voltage.solve(current);
  }

  /**
   * The admittance matrix B⁻¹·A, S; of Y data, exactly the data. Empty where there is none: a
   * short, two ports on one node (as far as rounding can tell), an entry beyond doubles.
   */
  public Optional<Matrix> findAdmittance() {
    return current.solve(voltage);
  }
}
