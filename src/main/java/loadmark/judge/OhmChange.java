package loadmark.judge;

import java.util.List;
import java.util.OptionalDouble;
import loadmark.response.Change;
import loadmark.response.Level;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/** |Z_with − Z_without| at most {@code mostOhm}. The value beside it is the relative change. */
record OhmChange(double mostOhm) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Ohms with = loading.with();
    Ohms without = loading.without();
    if (with.isUndetermined() || without.isUndetermined()) {
      return Unknowns.unsolved();
    }
    if (with.isOpen() && without.isOpen()) {
      return new Reading.Unknown("∞ − ∞, open with and without");
    }
    Reading.Known ohms = Excess.atMost(difference(loading), mostOhm, error(loading));
    Change change = loading.change();
    OptionalDouble ratio =
        change.isFinite() ? OptionalDouble.of(change.magnitude()) : OptionalDouble.empty();
    return new Reading.Known(ratio, ohms.value(), ohms.excess(), ohms.slack(), ohms.spread());
  }

  /** Relative, of the difference. */
  private static double error(Loading loading) {
    if (loading.change().isFinite()) {
      return loading.changeError() + loading.withoutError();
    }
    return Math.max(loading.withError(), loading.withoutError());
  }

  /** Ω; from the change where there is one, which cancels nothing. */
  private static double difference(Loading loading) {
    Ohms with = loading.with();
    Ohms without = loading.without();
    if (with.isOpen() || without.isOpen()) {
      return Double.POSITIVE_INFINITY;
    }
    return loading.change().isFinite()
        ? loading.change().magnitude() * without.magnitude()
        : Math.hypot(with.re() - without.re(), with.im() - without.im());
  }

  @Override
  public List<Level> levels(double excess) {
    double ohm = mostOhm * Math.exp(excess);
    return ohm > 0 && ohm < Double.POSITIVE_INFINITY ? List.of(Level.ofDifference(ohm)) : List.of();
  }
}
