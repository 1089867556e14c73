package loadmark.study;

import loadmark.network.Band;
import loadmark.network.Sweep;

/** The frequencies of tables and pictures. */
final class SweepPoints {
  private SweepPoints() {}

  /**
   * DC first where the sweep has it, then the band in equal logarithmic steps.
   *
   * @return Hz, rising, both ends of the band exact
   */
  static double[] of(Sweep sweep) {
    int dc = sweep.dc() ? 1 : 0;
    if (sweep.band().isEmpty()) {
      return new double[dc];
    }
    Band band = sweep.band().get();
    int points = band.isPoint() ? 1 : sweep.points();
    double[] hz = new double[dc + points];
    double from = Math.log(band.fromHz());
    double span = Math.log(band.toHz()) - from;
    for (int i = 0; i < points; i++) {
      hz[dc + i] = Math.exp(from + span * i / Math.max(1, points - 1));
    }
    hz[hz.length - 1] = band.toHz();
    hz[dc] = band.fromHz();
    return hz;
  }
}
