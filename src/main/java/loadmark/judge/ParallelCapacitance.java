package loadmark.judge;

import java.util.OptionalDouble;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/**
 * Im(1/Z_with)/ω in a window, F; its bounds may be of either sign. The excess is the distance past
 * the nearer bound against the larger of the two. The slack is a share of the bound; at a bound of
 * 0 what rounding leaves of |1/Z_with|/ω.
 */
record ParallelCapacitance(OptionalDouble from, OptionalDouble to) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Ohms z = loading.with();
    if (z.isUndetermined()) {
      return Unknowns.unsolved();
    }
    if (loading.hz() == 0) {
      return new Reading.Unknown("no capacitance");
    }
    if (z.isZero()) {
      return new Reading.Unknown("a short has no parallel capacitance");
    }
    double omega = 2 * Math.PI * loading.hz();
    double size = z.magnitude();
    double whole = z.isOpen() ? 0 : 1 / size / omega;
    return read(z.isOpen() ? 0 : -(z.im() / size) * whole, whole);
  }

  private Reading read(double farad, double whole) {
    double over = to.isPresent() ? farad - to.getAsDouble() : Double.NEGATIVE_INFINITY;
    double under = from.isPresent() ? from.getAsDouble() - farad : Double.NEGATIVE_INFINITY;
    double bound = Math.abs(over > under ? to.orElse(0) : from.orElse(0));
    double slack = bound > 0 ? Excess.SLACK * bound : ParallelResistance.ROUNDING * whole;
    double scale = Math.max(Math.abs(from.orElse(0)), Math.abs(to.orElse(0)));
    double past = Math.max(over, under);
    return Reading.of(farad, scale > 0 ? past / scale : past / whole(whole), past > slack);
  }

  private static double whole(double whole) {
    return whole > 0 ? whole : 1;
  }
}
