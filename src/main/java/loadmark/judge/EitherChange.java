package loadmark.judge;

import loadmark.response.Loading;

/** Kept where either bound on the change is: the easier of the two at each frequency. */
record EitherChange(RelativeChange relative, OhmChange ohms) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Reading first = relative.read(loading);
    Reading second = ohms.read(loading);
    if (first instanceof Reading.Known a && second instanceof Reading.Known b) {
      return new Reading.Known(
          a.value(), b.valueOhm(), Math.min(a.excess(), b.excess()), a.broken() && b.broken());
    }
    // One alone can keep the limit, but not break it.
    Reading known = first instanceof Reading.Known ? first : second;
    Reading unknown = first instanceof Reading.Known ? second : first;
    return known instanceof Reading.Known one && !one.broken() ? one : unknown;
  }
}
