package loadmark.judge;

import loadmark.response.Comparison;
import loadmark.response.Loading;

/** A limit as a function of frequency: one port, one set of loads, one measure. */
record Gauge(Comparison comparison, Measure measure) {
  Sample at(double hz) {
    return of(comparison.at(hz));
  }

  Sample of(Loading loading) {
    return new Sample(loading, measure.read(loading));
  }
}
