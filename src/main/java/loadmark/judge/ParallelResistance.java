package loadmark.judge;

import java.util.OptionalDouble;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/**
 * 1/Re(1/Z_with) in a window, Ω. Judged as a conductance, which stays continuous where the
 * resistance passes through infinity: a negative conductance counts as beyond an infinite
 * resistance.
 */
record ParallelResistance(OptionalDouble from, OptionalDouble to) implements Measure {
  /** A conductance below this share of |1/Z| is what rounding left of none. */
  static final double ROUNDING = 1e-13;

  @Override
  public Reading read(Loading loading) {
    Ohms z = loading.with();
    if (z.isUndetermined()) {
      return Unknowns.unsolved();
    }
    if (z.isZero()) {
      return loading.hz() == 0
          ? Excess.within(0, from, to)
          : new Reading.Unknown("a short has no parallel resistance");
    }
    double cosine = z.isOpen() ? 0 : z.re() / z.magnitude();
    if (Math.abs(cosine) < ROUNDING) {
      return Excess.within(Double.POSITIVE_INFINITY, from, to);
    }
    double ohm = z.magnitude() / cosine;
    if (ohm > 0) {
      return Excess.within(ohm, from, to);
    }
    Reading.Known beyond = Excess.within(Double.POSITIVE_INFINITY, from, to);
    return Reading.of(ohm, beyond.excess(), beyond.broken());
  }
}
