package loadmark.solve;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * What was found at each frequency.
 *
 * @param without the port's impedance in the reference, Ω
 * @param with its impedance in the case, Ω
 * @param change with/without − 1
 */
public record Solutions(Quantity without, Quantity with, Quantity change) {

  static Solutions of(int size, boolean estimates) {
    return new Solutions(
        new Quantity(size, estimates),
        new Quantity(size, estimates),
        new Quantity(size, estimates));
  }

  /** Of one frequency: settles the change where an impedance is 0, infinite or undetermined. */
  void decide() {
    if (without.isUndetermined() || with.isUndetermined()) {
      change.set(0, State.UNDETERMINED);
    } else if (without.isInfinite()) {
      if (with.isInfinite()) {
        change.set(0, State.UNDETERMINED);
      } else {
        change.set(0, -1, 0, 0);
      }
    } else if (without.isZero()) {
      change.set(0, with.isZero() ? State.UNDETERMINED : State.INFINITE);
    } else if (with.isInfinite()) {
      change.set(0, State.INFINITE);
    } else if (with.isZero()) {
      change.set(0, -1, 0, 0);
    }
  }

  /** Takes over what another found at its only frequency, unless it is no better. */
  void improve(int i, Solutions other) {
    without.improve(i, other.without);
    with.improve(i, other.with);
    change.improve(i, other.change);
  }

  void setUndetermined(int i) {
    without.set(i, State.UNDETERMINED);
    with.set(i, State.UNDETERMINED);
    change.set(i, State.UNDETERMINED);
  }

  /** What is known of a number. */
  public enum State {
    FINITE,
    INFINITE,
    UNDETERMINED
  }

  /** A complex number at each frequency. The arrays are for the one who asked. */
  public static final class Quantity {
    /** With a larger one a number is no better than none. */
    private static final double USEFUL_ERROR = 1e-6;

    /** Where it is not finite; no array while all are. */
    private State @Nullable [] state;

    private final double[] re;
    private final double[] im;
    private final double @Nullable [] error;

    private Quantity(int size, boolean estimates) {
      re = new double[size];
      im = new double[size];
      error = estimates ? new double[size] : null;
      if (error != null) {
        Arrays.fill(error, Double.POSITIVE_INFINITY);
      }
    }

    /** What is known at a frequency. */
    public State state(int i) {
      return state == null ? State.FINITE : state[i];
    }

    /** The real part; 0 unless finite. */
    public double re(int i) {
      return re[i];
    }

    /** The imaginary part; 0 unless finite. */
    public double im(int i) {
      return im[i];
    }

    /** A bound of the relative error; infinite where unknown. */
    public double error(int i) {
      return error == null ? Double.POSITIVE_INFINITY : error[i];
    }

    private boolean isUndetermined() {
      return state(0) == State.UNDETERMINED;
    }

    private boolean isInfinite() {
      return state(0) == State.INFINITE;
    }

    private boolean isZero() {
      return state(0) == State.FINITE && re[0] == 0 && im[0] == 0;
    }

    private void improve(int i, Quantity other) {
      if (error != null && error[i] < USEFUL_ERROR && error[i] <= other.error(0)) {
        return;
      }
      if (other.state(0) == State.FINITE) {
        set(i, other.re[0], other.im[0], other.error(0));
      } else {
        set(i, other.state(0));
      }
    }

    double @Nullable [] error() {
      return error;
    }

    void set(int i, double toRe, double toIm, double toError) {
      re[i] = toRe;
      im[i] = toIm;
      if (error != null) {
        error[i] = toError;
      }
      if (state != null) {
        state[i] = State.FINITE;
      }
    }

    void set(int i, State to) {
      set(i, 0, 0, to == State.UNDETERMINED ? Double.POSITIVE_INFINITY : 0);
      if (state == null) {
        state = new State[re.length];
        Arrays.fill(state, State.FINITE);
      }
      state[i] = to;
    }

    void copy(Quantity other, int from, int n) {
      System.arraycopy(other.re, from, re, from, n);
      System.arraycopy(other.im, from, im, from, n);
      if (error != null && other.error != null) {
        System.arraycopy(other.error, from, error, from, n);
      }
    }

    void copy(double[] fromRe, double[] fromIm, int from, int n) {
      System.arraycopy(fromRe, 0, re, from, n);
      System.arraycopy(fromIm, 0, im, from, n);
    }

    void fill(double toRe, double toIm, int from, int n) {
      Arrays.fill(re, from, from + n, toRe);
      Arrays.fill(im, from, from + n, toIm);
    }
  }
}
