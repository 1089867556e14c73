package loadmark.touchstone;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Measured parameters of one or two ports over frequency. Immutable, thread-safe.
 *
 * <p>Between two points the real and the imaginary part of each parameter that the file gives (S, Y
 * or Z, not their magnitude and phase) go along a straight line in frequency; at a point they are
 * the data themselves; outside the points there is nothing. The reasons: it adds no model of what
 * was measured; opens, shorts and zeros of transmission are passed through without a pole; no phase
 * has to be unwrapped; and since the passive S, Y and Z matrices are convex sets, what is passive
 * at both points is passive between them. The error of a part is at most h²/8 times the largest
 * second derivative over an interval of width h: impedance data of a sharp parallel resonance, and
 * admittance data of a series one, want close points.
 *
 * <p>A file may have a million points, so that they are held in arrays; none leaves this class.
 */
public final class MeasuredData {
  private final Parameter parameter;
  private final List<Double> referenceOhm;

  /** Hz, rising, not modified. */
  private final double[] hz;

  /** Point by point, entries row by row, re before im; not modified. */
  private final double[] values;

  /** Takes the arrays over; twice the largest value is still a double. */
  MeasuredData(Parameter parameter, List<Double> referenceOhm, double[] hz, double[] values) {
    this.parameter = parameter;
    this.referenceOhm = List.copyOf(referenceOhm);
    this.hz = hz;
    this.values = values;
    if (hz.length == 0 || values.length != hz.length * stride()) {
      throw new IllegalArgumentException(hz.length + " points, " + values.length + " values");
    }
  }

  private int stride() {
    return 2 * ports() * ports();
  }

  /** How many ports: 1 or 2. */
  public int ports() {
    return referenceOhm.size();
  }

  /** What the file gives. */
  public Parameter parameter() {
    return parameter;
  }

  /** The reference resistance of each port, Ω; positive. */
  public List<Double> referenceOhm() {
    return referenceOhm;
  }

  /** How many points; at least one. */
  public int size() {
    return hz.length;
  }

  /**
   * The frequency of a point, Hz; rising, the first may be 0.
   *
   * @param point from 0
   */
  public double hz(int point) {
    return hz[point];
  }

  /** The lowest frequency, Hz. */
  public double fromHz() {
    return hz[0];
  }

  /** The highest frequency, Hz. */
  public double toHz() {
    return hz[hz.length - 1];
  }

  /** Whether there is an answer at a frequency: from the lowest to the highest, both included. */
  public boolean covers(double hz) {
    return hz >= fromHz() && hz <= toHz();
  }

  /**
   * The data of a point.
   *
   * @param point from 0
   * @return parameters as in the file: S plain, Y in S, Z in Ω
   */
  public Matrix values(int point) {
    List<Complex> entries = new ArrayList<>();
    for (int i = point * stride(); i < (point + 1) * stride(); i += 2) {
      entries.add(new Complex(values[i], values[i + 1]));
    }
    return new Matrix(entries);
  }

  /** The parameters at a frequency, as in the file; empty outside the data. */
  public Optional<Matrix> findValues(double hz) {
    if (!covers(hz)) {
      return Optional.empty();
    }
    // Adding 0 turns a negative zero into DC.
    int found = Arrays.binarySearch(this.hz, hz + 0.0);
    return Optional.of(found >= 0 ? values(found) : between(-found - 2, hz));
  }

  private Matrix between(int below, double hz) {
    double share = (hz - this.hz[below]) / (this.hz[below + 1] - this.hz[below]);
    List<Complex> entries = new ArrayList<>();
    int first = below * stride();
    for (int i = first; i < first + stride(); i += 2) {
      entries.add(new Complex(mix(i, share), mix(i + 1, share)));
    }
    return new Matrix(entries);
  }

  /** In this form what is equal at both points is equal between them: an open stays open. */
  private double mix(int i, double share) {
    double from = values[i];
    return from + share * (values[i + stride()] - from);
  }

  /** How voltages and currents go together at a frequency; empty outside the data. */
  public Optional<PortRelation> find(double hz) {
    return findValues(hz).map(v -> parameter.relate(v, referenceOhm));
  }
}
