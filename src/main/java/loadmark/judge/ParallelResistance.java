package loadmark.judge;

import java.util.List;
import java.util.OptionalDouble;
import loadmark.network.Criterion;
import loadmark.response.Level;
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
          ? Excess.within(0, from, to, Spread.NONE)
          : new Reading.Unknown("a short has no parallel resistance");
    }
    double cosine = z.isOpen() ? 0 : z.re() / z.magnitude();
    if (Math.abs(cosine) < ROUNDING) {
      double least = z.magnitude() / (ROUNDING + loading.withError());
      return least < from.orElse(0) ? Unknowns.unsolved() : infinite();
    }
    double ohm = z.magnitude() / cosine;
    if (ohm > 0) {
      Spread spread = Spread.ofLogarithm(loading.withError() / cosine).turned();
      return Excess.within(ohm, from, to, spread);
    }
    return Reading.of(ohm, infinite().excess(), infinite().slack(), Spread.NONE);
  }

  private Reading.Known infinite() {
    return Excess.within(Double.POSITIVE_INFINITY, from, to, Spread.NONE);
  }

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofWindow(Criterion.PARALLEL_RESISTANCE, from, to, excess);
  }
}
