package loadmark.response;

import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.network.OnePort;

/**
 * A level of a criterion, in the criterion's unit.
 *
 * @param inOhm for {@link Criterion#CHANGE}: of |Z_with − Z_without| in Ω
 * @param reference the impedance of a criterion that has one, else empty
 */
public record Level(Criterion criterion, boolean inOhm, Optional<OnePort> reference, double value) {

  public Level {
    boolean needed =
        switch (criterion) {
          case MAGNITUDE_WITHIN, PHASE_WITHIN, RETURN_LOSS -> true;
          default -> false;
        };
    if (needed != reference.isPresent() || (inOhm && criterion != Criterion.CHANGE)) {
      throw new IllegalArgumentException(criterion + ", in ohm " + inOhm + ", " + reference);
    }
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(criterion + " of " + value);
    }
  }

  /** A level in the criterion's own unit. */
  public static Level of(Criterion criterion, Optional<OnePort> reference, double value) {
    return new Level(criterion, false, reference, value);
  }

  /** A level of |Z_with − Z_without|, Ω. */
  public static Level ofDifference(double ohm) {
    return new Level(Criterion.CHANGE, true, Optional.empty(), ohm);
  }
}
