package loadmark.judge;

import java.util.List;
import java.util.OptionalDouble;
import loadmark.network.Criterion;
import loadmark.response.Level;
import loadmark.response.Loading;

/** |Z_with| in a window, Ω. */
record MagnitudeWindow(OptionalDouble from, OptionalDouble to) implements Measure {
  @Override
  public Reading read(Loading loading) {
    return loading.with().isUndetermined()
        ? Unknowns.unsolved()
        : Excess.within(
            loading.with().magnitude(), from, to, Spread.ofLogarithm(loading.withError()));
  }

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofWindow(Criterion.MAGNITUDE, from, to, excess);
  }
}
