package loadmark.touchstone;

/**
 * A one-port's impedance at a frequency.
 *
 * @param hz 0 for DC
 * @param impedance Ω
 */
public record ImpedancePoint(double hz, Complex impedance) {
  public ImpedancePoint {
    if (!(hz >= 0 && hz < Double.POSITIVE_INFINITY) || !impedance.isFinite()) {
      throw new IllegalArgumentException(hz + " Hz: " + impedance);
    }
  }
}
