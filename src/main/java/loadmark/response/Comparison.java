package loadmark.response;

import java.util.List;

/** One port with one set of loads against another, as a function of frequency. Thread-safe. */
public interface Comparison {

  /** At one frequency, Hz; 0 for DC. */
  Loading at(double hz);

  /** At many frequencies, Hz, in the order given; faster than one by one. */
  List<Loading> at(double[] hz);
}
