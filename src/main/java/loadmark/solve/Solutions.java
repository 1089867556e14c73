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

  /** Settles the change where an impedance is 0, infinite or undetermined. */
  static void decide(Solutions to, int i) {
    Quantity without = to.without;
    Quantity with = to.with;
    if (without.isUndetermined(i) || with.isUndetermined(i)) {
      to.change.set(i, State.UNDETERMINED);
    } else if (without.state(i) == State.INFINITE) {
      if (with.state(i) == State.INFINITE) {
        to.change.set(i, State.UNDETERMINED);
      } else {
        to.change.set(i, -1, 0, 0);
      }
    } else if (without.isZero(i)) {
      to.change.set(i, with.isZero(i) ? State.UNDETERMINED : State.INFINITE);
    } else if (with.state(i) == State.INFINITE) {
      to.change.set(i, State.INFINITE);
    } else if (with.isZero(i)) {
      to.change.set(i, -1, 0, 0);
    }
  }

  /** What is known of a number. */
  public enum State {
    FINITE,
    INFINITE,
    UNDETERMINED
  }

  /** A complex number at each frequency. The arrays are for the one who asked. */
  public static final class Quantity {
    /** Where it is not finite; no array while all are. */
    private State @Nullable [] state;

    private final double[] re;
    private final double[] im;
    private final double @Nullable [] error;

    private Quantity(int size, boolean estimates) {
      re = new double[size];
      im = new double[size];
      error = estimates ? new double[size] : null;
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

    boolean isUndetermined(int i) {
      return state(i) == State.UNDETERMINED;
    }

    boolean isZero(int i) {
      return state(i) == State.FINITE && re[i] == 0 && im[i] == 0;
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
