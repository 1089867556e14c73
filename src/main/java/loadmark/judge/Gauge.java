package loadmark.judge;

import java.util.List;
import loadmark.response.Comparison;
import loadmark.response.Loading;

/** A limit as a function of frequency: one port, one set of loads, one measure. */
record Gauge(Comparison comparison, Measure measure) {
  Sample at(double hz) {
    return of(comparison.at(hz));
  }

  /** At many frequencies, in their order. */
  List<Sample> at(double[] hz) {
    return comparison.at(hz).stream().map(this::of).toList();
  }

  Sample of(Loading loading) {
    Reading reading = measure.read(loading);
    boolean known = !(reading instanceof Reading.Known one) || one.spread().isKnown();
    return new Sample(loading, known ? reading : Unknowns.unsolved());
  }
}
