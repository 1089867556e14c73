package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.response.Change;
import loadmark.response.Level;
import loadmark.response.Loading;

/** The change of the phase, degrees without sign, at most {@code most}. */
record PhaseChange(double most) implements Measure {
  /** Below this |1 + h| the sum cancels, and the two impedances tell the angle better. */
  private static final double CANCELS = 0.5;

  @Override
  public Reading read(Loading loading) {
    if (Angle.hasNone(loading.with())) {
      return Unknowns.ofPhase(loading.with());
    }
    if (Angle.hasNone(loading.without())) {
      return Unknowns.ofPhase(loading.without());
    }
    Change h = loading.change();
    double sum = h.isFinite() ? Math.hypot(1 + h.re(), h.im()) : 0;
    if (sum < CANCELS) {
      double degrees = Angle.between(loading.with(), loading.without());
      return read(degrees, loading.withError() + loading.withoutError());
    }
    return read(Angle.of(1 + h.re(), h.im()), loading.changeError() * (h.magnitude() / sum));
  }

  /**
   * @param error of the angle, radians
   */
  private Reading read(double degrees, double error) {
    double size = Math.abs(degrees);
    return Excess.atMost(size, most, size > 0 ? error / Math.toRadians(size) : 0);
  }

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofMost(Criterion.PHASE_CHANGE, Optional.empty(), most, excess);
  }
}
