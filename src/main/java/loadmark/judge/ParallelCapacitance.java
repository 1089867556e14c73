package loadmark.judge;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import loadmark.network.Criterion;
import loadmark.response.Level;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/**
 * Im(1/Z_with)/ω in a window, F; its bounds may be of either sign. The excess is the distance past
 * the nearer bound against the larger of the two, and the slack a share of the bound. Against 0
 * alone nothing has a size: the excess is then the logarithm of the distance above the least
 * number, with its sign, and 0 where the distance is what rounding leaves of |1/Z_with|/ω.
 */
record ParallelCapacitance(OptionalDouble from, OptionalDouble to) implements Measure {
  private static final double LEAST = Double.MIN_NORMAL;

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
    return read(z.isOpen() ? 0 : -(z.im() / size) * whole, whole, loading.withError());
  }

  private Reading read(double farad, double whole, double error) {
    double over = to.isPresent() ? farad - to.getAsDouble() : Double.NEGATIVE_INFINITY;
    double under = from.isPresent() ? from.getAsDouble() - farad : Double.NEGATIVE_INFINITY;
    double past = Math.max(over, under);
    if (scale() == 0) {
      return againstZero(farad, past, Math.max(ParallelResistance.ROUNDING, error) * whole);
    }
    double bound = Math.abs(over > under ? to.orElse(0) : from.orElse(0));
    double slack =
        bound > 0 ? Excess.SLACK * bound : Math.max(ParallelResistance.ROUNDING, error) * whole;
    return Reading.of(farad, past / scale(), slack / scale(), Spread.of(error * (whole / scale())));
  }

  private static Reading againstZero(double farad, double past, double rounding) {
    if (!Double.isFinite(rounding)) {
      return Unknowns.unsolved();
    }
    double excess =
        Math.abs(past) <= rounding ? 0 : Math.signum(past) * Math.log1p(Math.abs(past) / LEAST);
    return Reading.of(farad, excess, 0, Spread.NONE);
  }

  private double scale() {
    return Math.max(Math.abs(from.orElse(0)), Math.abs(to.orElse(0)));
  }

  @Override
  public List<Level> levels(double excess) {
    double past =
        scale() == 0
            ? Math.signum(excess) * Math.expm1(Math.abs(excess)) * LEAST
            : excess * scale();
    return DoubleStream.of(to.orElse(Double.NaN) + past, from.orElse(Double.NaN) - past)
        .filter(Double::isFinite)
        .mapToObj(value -> Level.of(Criterion.PARALLEL_CAPACITANCE, Optional.empty(), value))
        .toList();
  }

  /** Against a bound the excess is no logarithm: its share of the value counts. */
  @Override
  public double grain(Reading.Known known) {
    return scale() == 0 ? GRAIN : GRAIN * Math.abs(known.value().orElse(0)) / scale();
  }
}
