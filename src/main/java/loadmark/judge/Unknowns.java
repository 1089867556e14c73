package loadmark.judge;

import loadmark.response.Loading;
import loadmark.response.Ohms;

/** Why nothing can be said, in a few words for people. */
final class Unknowns {
  private static final String UNSOLVED = "no solution that can be trusted";

  private Unknowns() {}

  /** Why a relative change is undetermined. */
  static Reading ofChange(Loading loading) {
    if (loading.with().isOpen() && loading.without().isOpen()) {
      return new Reading.Unknown("∞/∞, open with and without");
    }
    if (loading.with().isZero() && loading.without().isZero()) {
      return new Reading.Unknown("0/0, a short with and without");
    }
    return unsolved();
  }

  /** Why an impedance has no phase. */
  static Reading ofPhase(Ohms z) {
    if (z.isUndetermined()) {
      return unsolved();
    }
    return new Reading.Unknown(z.isOpen() ? "an open port has no phase" : "a short has no phase");
  }

  static Reading unsolved() {
    return new Reading.Unknown(UNSOLVED);
  }
}
