package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.network.OnePort;
import loadmark.response.Level;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.response.OnePortImpedance;

/** | |Z_with|/|Z_ref| − 1 | at most {@code most}. */
record MagnitudeWithin(double most, OnePort reference) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Ohms with = loading.with();
    Ohms ref = OnePortImpedance.at(reference, loading.hz());
    if (with.isUndetermined() || ref.isUndetermined()) {
      return Unknowns.unsolved();
    }
    if (with.isOpen() && ref.isOpen()) {
      return new Reading.Unknown("∞/∞, open like its reference");
    }
    if (with.isZero() && ref.isZero()) {
      return new Reading.Unknown("0/0, a short like its reference");
    }
    double value = Math.abs(ratioLessOne(with.magnitude(), ref.magnitude()));
    double error = loading.withError() * (with.magnitude() / ref.magnitude());
    return Excess.atMost(value, most, value > 0 ? error / value : 0);
  }

  private static double ratioLessOne(double a, double b) {
    return Double.isInfinite(a) || Double.isInfinite(b) ? a / b - 1 : (a - b) / b;
  }

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofMost(Criterion.MAGNITUDE_WITHIN, Optional.of(reference), most, excess);
  }
}
