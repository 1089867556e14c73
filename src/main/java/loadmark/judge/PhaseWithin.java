package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.network.OnePort;
import loadmark.response.Level;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.response.OnePortImpedance;

/** |arg(Z_with/Z_ref)|, degrees, at most {@code most}. */
record PhaseWithin(double most, OnePort reference) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Ohms with = loading.with();
    Ohms ref = OnePortImpedance.at(reference, loading.hz());
    if (Angle.hasNone(with)) {
      return Unknowns.ofPhase(with);
    }
    if (Angle.hasNone(ref)) {
      return Unknowns.ofPhase(ref);
    }
    double value = Math.abs(Angle.between(with, ref));
    double error = value > 0 ? loading.withError() / Math.toRadians(value) : 0;
    return Excess.atMost(value, most, error);
  }

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofMost(Criterion.PHASE_WITHIN, Optional.of(reference), most, excess);
  }
}
