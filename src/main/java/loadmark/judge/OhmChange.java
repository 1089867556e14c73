package loadmark.judge;

import java.util.OptionalDouble;
import loadmark.response.Change;
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
    Reading.Known ohms = Excess.atMost(difference(loading), mostOhm);
    Change change = loading.change();
    OptionalDouble ratio =
        change.isFinite() ? OptionalDouble.of(change.magnitude()) : OptionalDouble.empty();
    return new Reading.Known(ratio, ohms.value(), ohms.excess(), ohms.broken());
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
}
