package loadmark.judge;

import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import loadmark.network.Criterion;
import loadmark.response.Level;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/**
 * The phase of Z_with in a window, degrees, whole turns aside. The excess is the distance past the
 * nearer edge in radians; the value is told within half a turn of the window's middle. The slack is
 * a share of the edge, or of the window's width at an edge of 0.
 */
record PhaseWindow(double from, double to) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Ohms z = loading.with();
    if (Angle.hasNone(z)) {
      return Unknowns.ofPhase(z);
    }
    double middle = from + (to - from) / 2;
    double off = Angle.wrap(z.phaseDegrees() - middle);
    double past = Math.abs(off) - (to - from) / 2;
    double edge = Math.abs(off > 0 ? to : from);
    double slack = Excess.SLACK * (edge == 0 ? to - from : edge);
    return Reading.of(
        middle + off, Math.toRadians(past), Math.toRadians(slack), Spread.of(loading.withError()));
  }

  @Override
  public double grain(Reading.Known known) {
    return GRAIN * Math.toRadians(Math.abs(known.value().orElse(0)));
  }

  @Override
  public List<Level> levels(double excess) {
    double degrees = Math.toDegrees(excess);
    return DoubleStream.of(from - degrees, to + degrees)
        .filter(Double::isFinite)
        .mapToObj(value -> Level.of(Criterion.PHASE, Optional.empty(), value))
        .toList();
  }
}
