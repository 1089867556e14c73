package loadmark.touchstone;

import java.util.ArrayList;
import java.util.List;

/** What a file's numbers are. */
public enum Parameter {
  /** Scattering parameters, plain numbers, against the reference resistances. */
  S,
  /** Admittances, S. */
  Y,
  /** Impedances, Ω. */
  Z;

  /** A number of version 1.1, where Y and Z are divided by those of the reference, in SI units. */
  double denormalised(double value, double referenceOhm) {
    return switch (this) {
      case S -> value;
      case Y -> value / referenceOhm;
      case Z -> value * referenceOhm;
    };
  }

  /**
   * How voltages and currents go together.
   *
   * <p>From S: with V = √r·(a + b), I = (a − b)/√r and b = S·a, T = √r·S/√r has (1 − T)·V = (1 +
   * T)·r·I, r real and on the diagonal (K. Kurokawa, Power waves and the scattering matrix, IEEE
   * Trans. MTT 13(2), 1965, for real references).
   *
   * @param referenceOhm a resistance a port
   */
  PortRelation relate(Matrix values, List<Double> referenceOhm) {
    Matrix unit = Matrix.unit(values.ports());
    return switch (this) {
      case Y -> new PortRelation(values, unit);
      case Z -> new PortRelation(unit, values);
      case S -> {
        Matrix voltageScattering = scaled(values, referenceOhm, true);
        Matrix ohm = scaled(unit.plus(voltageScattering), referenceOhm, false);
        yield new PortRelation(unit.minus(voltageScattering), ohm);
      }
    };
  }

  /** Entry ij times √(r_i/r_j), or times r_j. */
  private static Matrix scaled(Matrix values, List<Double> referenceOhm, boolean ratio) {
    List<Complex> entries = new ArrayList<>();
    for (int i = 0; i < values.ports(); i++) {
      for (int j = 0; j < values.ports(); j++) {
        double ohm = referenceOhm.get(j);
        double factor = ratio ? Math.sqrt(referenceOhm.get(i) / ohm) : ohm;
        entries.add(values.at(i + 1, j + 1).times(factor));
      }
    }
    return new Matrix(entries);
  }
}
