package loadmark.judge;

import loadmark.network.OnePort;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.response.OnePortImpedance;

/** 20·log10 |(Z_with + Z_r)/(Z_with − Z_r)| at least {@code least}, dB. The excess is in nepers. */
record ReturnLoss(double least, OnePort reference) implements Measure {
  private static final double DB_PER_NEPER = 20 / Math.log(10);

  @Override
  public Reading read(Loading loading) {
    Ohms z = loading.with();
    Ohms ref = OnePortImpedance.at(reference, loading.hz());
    if (z.isUndetermined() || ref.isUndetermined()) {
      return Unknowns.unsolved();
    }
    if (z.isOpen() && ref.isOpen()) {
      return new Reading.Unknown("∞/∞, open like its reference");
    }
    if (z.isZero() && ref.isZero()) {
      return new Reading.Unknown("0/0, a short like its reference");
    }
    double nepers = z.isOpen() || ref.isOpen() ? 0 : nepers(z, ref);
    double excess = least / DB_PER_NEPER - nepers;
    if (Double.isInfinite(nepers)) {
      return Reading.unbounded(excess);
    }
    double db = nepers * DB_PER_NEPER;
    return Reading.of(db, excess, least - db > Excess.SLACK * Math.abs(least));
  }

  /**
   * ln |(z + r)/(z − r)| = ½·ln(1 + 4·Re(z·r*)/|z − r|²), which keeps a small loss exact; +∞ at a
   * match, −∞ at z = −r.
   */
  private static double nepers(Ohms z, Ohms r) {
    double scale = Math.max(z.magnitude(), r.magnitude());
    double zRe = z.re() / scale;
    double zIm = z.im() / scale;
    double rRe = r.re() / scale;
    double rIm = r.im() / scale;
    double sum = Math.hypot(zRe + rRe, zIm + rIm);
    double difference = Math.hypot(zRe - rRe, zIm - rIm);
    if (sum > difference / 2 && sum < difference * 2) {
      double product = zRe * rRe + zIm * rIm;
      return Math.log1p(4 * product / (difference * difference)) / 2;
    }
    return Excess.logRatio(sum, difference);
  }
}
