package loadmark.judge;

import loadmark.response.Change;
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
    return Excess.atMost(Math.abs(degrees(loading)), most);
  }

  private static double degrees(Loading loading) {
    Change h = loading.change();
    if (!h.isFinite() || Math.hypot(1 + h.re(), h.im()) < CANCELS) {
      return Angle.between(loading.with(), loading.without());
    }
    return Angle.of(1 + h.re(), h.im());
  }
}
