package loadmark.judge;

import java.util.OptionalDouble;

/** What a limit says at one frequency. */
sealed interface Reading {

  /**
   * A value and where it stands.
   *
   * @param value in the unit of the criterion; empty where it has no bound
   * @param valueOhm the difference in Ω where a change is bounded in Ω; empty where it has no bound
   * @param excess how far past the bound, without unit: positive past it, negative within, larger
   *     is worse; may be infinite
   * @param broken whether it is past the bound by more than the slack
   */
  record Known(OptionalDouble value, OptionalDouble valueOhm, double excess, boolean broken)
      implements Reading {
    public Known {
      if (Double.isNaN(excess)) {
        throw new IllegalArgumentException("no excess for the value " + value);
      }
    }
  }

  /** Nothing can be said; {@code why} in a few words for people. */
  record Unknown(String why) implements Reading {}

  static Known of(double value, double excess, boolean broken) {
    return new Known(OptionalDouble.of(value), OptionalDouble.empty(), excess, broken);
  }

  /** The value has no bound. */
  static Known unbounded(double excess) {
    return new Known(OptionalDouble.empty(), OptionalDouble.empty(), excess, excess > 0);
  }
}
