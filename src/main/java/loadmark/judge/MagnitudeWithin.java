package loadmark.judge;

import loadmark.network.OnePort;
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
    return Excess.atMost(Math.abs(ratioLessOne(with.magnitude(), ref.magnitude())), most);
  }

  private static double ratioLessOne(double a, double b) {
    return Double.isInfinite(a) || Double.isInfinite(b) ? a / b - 1 : (a - b) / b;
  }
}
