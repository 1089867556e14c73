package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.network.OnePort;
import loadmark.response.Level;
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
    boolean finite = z.isFinite() && ref.isFinite();
    double nepers = finite ? nepers(z, ref) : 0;
    double excess = least / DB_PER_NEPER - nepers;
    if (Double.isInfinite(nepers)) {
      return Reading.unbounded(excess);
    }
    double db = nepers * DB_PER_NEPER;
    double slack = Excess.SLACK * Math.abs(least) / DB_PER_NEPER;
    Spread spread = finite ? Spread.ofLogarithm(loading.withError() * slope(z, ref)) : Spread.NONE;
    return Reading.of(db, excess, slack, spread);
  }

  /** How far a relative error of z moves the loss in nepers: |2·z·r/(z² − r²)|. */
  private static double slope(Ohms z, Ohms r) {
    double scale = Math.max(z.magnitude(), r.magnitude());
    double sum = Math.hypot(z.re() / scale + r.re() / scale, z.im() / scale + r.im() / scale);
    double difference =
        Math.hypot(z.re() / scale - r.re() / scale, z.im() / scale - r.im() / scale);
    return 2 * (z.magnitude() / scale) * (r.magnitude() / scale) / sum / difference;
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

  @Override
  public List<Level> levels(double excess) {
    double db = least - excess * DB_PER_NEPER;
    return Double.isFinite(db)
        ? List.of(Level.of(Criterion.RETURN_LOSS, Optional.of(reference), db))
        : List.of();
  }
}
