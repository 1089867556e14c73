package loadmark.judge;

import java.util.List;
import loadmark.network.Bound;
import loadmark.network.Limit;
import loadmark.network.OnePort;
import loadmark.response.Level;
import loadmark.response.Loading;

/**
 * A limit without its scope: from what a port shows at one frequency to a value and how far it is
 * past its bound. The excess is continuous in frequency wherever the impedances are and have a
 * phase.
 */
sealed interface Measure
    permits RelativeChange,
        OhmChange,
        EitherChange,
        MagnitudeChange,
        PhaseChange,
        MagnitudeWindow,
        PhaseWindow,
        MagnitudeWithin,
        PhaseWithin,
        ParallelCapacitance,
        ParallelResistance,
        ReturnLoss {
  /** Relative: a tenth of what is promised of worst values. */
  double GRAIN = 1e-10;

  Reading read(Loading loading);

  /**
   * The levels of one criterion or of several that the value has wherever the excess is this one;
   * it may have them elsewhere too. None where no finite value has it.
   */
  List<Level> levels(double excess);

  /** The excess that a billionth of the value makes, by which worst values are told apart. */
  default double grain(Reading.Known known) {
    return GRAIN;
  }

  /** What judges {@code limit}, inside its scope. */
  static Measure of(Limit limit) {
    Bound bound = limit.bound();
    return switch (limit.criterion()) {
      case CHANGE -> change(bound);
      case MAGNITUDE_CHANGE -> new MagnitudeChange(most(bound));
      case PHASE_CHANGE -> new PhaseChange(most(bound));
      case MAGNITUDE -> new MagnitudeWindow(bound.atLeast(), bound.atMost());
      case PHASE -> new PhaseWindow(bound.atLeast().orElse(-180), bound.atMost().orElse(180));
      case MAGNITUDE_WITHIN -> new MagnitudeWithin(most(bound), reference(limit));
      case PHASE_WITHIN -> new PhaseWithin(most(bound), reference(limit));
      case PARALLEL_CAPACITANCE -> new ParallelCapacitance(bound.atLeast(), bound.atMost());
      case PARALLEL_RESISTANCE -> new ParallelResistance(bound.atLeast(), bound.atMost());
      case RETURN_LOSS -> new ReturnLoss(bound.atLeast().orElseThrow(), reference(limit));
    };
  }

  private static Measure change(Bound bound) {
    if (bound.atMostOhm().isEmpty()) {
      return new RelativeChange(most(bound));
    }
    OhmChange ohms = new OhmChange(bound.atMostOhm().getAsDouble());
    return bound.atMost().isEmpty()
        ? ohms
        : new EitherChange(new RelativeChange(most(bound)), ohms);
  }

  private static double most(Bound bound) {
    return bound.atMost().orElseThrow();
  }

  private static OnePort reference(Limit limit) {
    return limit.reference().orElseThrow();
  }
}
