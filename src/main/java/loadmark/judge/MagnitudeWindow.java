package loadmark.judge;

import java.util.OptionalDouble;
import loadmark.response.Loading;

/** |Z_with| in a window, Ω. */
record MagnitudeWindow(OptionalDouble from, OptionalDouble to) implements Measure {
  @Override
  public Reading read(Loading loading) {
    return loading.with().isUndetermined()
        ? Unknowns.unsolved()
        : Excess.within(loading.with().magnitude(), from, to);
  }
}
