package loadmark.allowance;

import java.util.Optional;
import loadmark.network.Limit;

/**
 * Where a growing load has to stop.
 *
 * @param t the last before the first that breaks a limit; infinite where none does, 0 where every
 *     one does
 * @param limit the limit that is broken first; empty where none is
 */
record Stop(double t, Optional<Limit> limit) {
  static final Stop NOWHERE = new Stop(Double.POSITIVE_INFINITY, Optional.empty());

  static Stop at(double t, Limit limit) {
    return t < Double.POSITIVE_INFINITY ? new Stop(t, Optional.of(limit)) : NOWHERE;
  }

  Stop sooner(Stop other) {
    return other.t < t ? other : this;
  }
}
