package loadmark.judge;

import loadmark.network.OnePort;
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
    return Excess.atMost(Math.abs(Angle.between(with, ref)), most);
  }
}
