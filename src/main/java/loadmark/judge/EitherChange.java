package loadmark.judge;

import java.util.List;
import java.util.stream.Stream;
import loadmark.response.Level;
import loadmark.response.Loading;

/** Kept where either bound on the change is: the easier of the two at each frequency. */
record EitherChange(RelativeChange relative, OhmChange ohms) implements Measure {
  @Override
  public Reading read(Loading loading) {
    Reading first = relative.read(loading);
    Reading second = ohms.read(loading);
    if (first instanceof Reading.Known a && second instanceof Reading.Known b) {
      Reading.Known easier = a.excess() < b.excess() ? a : b;
      return new Reading.Known(
          a.value(), b.valueOhm(), easier.excess(), easier.slack(), spread(a, b));
    }
    // One alone can keep the limit, but not break it.
    Reading known = first instanceof Reading.Known ? first : second;
    Reading unknown = first instanceof Reading.Known ? second : first;
    return known instanceof Reading.Known one && !one.broken() ? one : unknown;
  }

  private static Spread spread(Reading.Known a, Reading.Known b) {
    double excess = Math.min(a.excess(), b.excess());
    double most = Math.min(a.excess() + a.spread().up(), b.excess() + b.spread().up());
    double least = Math.min(a.excess() - a.spread().down(), b.excess() - b.spread().down());
    return Double.isInfinite(excess) ? Spread.NONE : new Spread(most - excess, excess - least);
  }

  @Override
  public List<Level> levels(double excess) {
    return Stream.of(relative, ohms).flatMap(one -> one.levels(excess).stream()).toList();
  }
}
