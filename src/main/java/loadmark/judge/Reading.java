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
   * @param slack the excess that is still kept
   * @param spread how well the excess is known
   */
  record Known(
      OptionalDouble value, OptionalDouble valueOhm, double excess, double slack, Spread spread)
      implements Reading {
    public Known {
      if (Double.isNaN(excess)) {
        throw new IllegalArgumentException("no excess for the value " + value);
      }
    }

    /** Past the bound by more than the slack. */
    boolean broken() {
      return excess > slack;
    }

    /**
     * Whether no error as large as the estimate could turn broken into kept, or kept into broken.
     */
    boolean sure() {
      return broken()
          ? excess == Double.POSITIVE_INFINITY || excess - spread.down() > slack
          : excess == Double.NEGATIVE_INFINITY || excess + spread.up() <= slack;
    }
  }

  /** Nothing can be said; {@code why} in a few words for people. */
  record Unknown(String why) implements Reading {}

  static Known of(double value, double excess, double slack, Spread spread) {
    return new Known(OptionalDouble.of(value), OptionalDouble.empty(), excess, slack, spread);
  }

  /** The value has no bound. */
  static Known unbounded(double excess) {
    return new Known(OptionalDouble.empty(), OptionalDouble.empty(), excess, 0, Spread.NONE);
  }
}
