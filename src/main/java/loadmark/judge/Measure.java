package loadmark.judge;

import loadmark.network.Bound;
import loadmark.network.Limit;
import loadmark.network.OnePort;
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

  Reading read(Loading loading);

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
