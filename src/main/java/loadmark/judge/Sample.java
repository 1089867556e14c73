package loadmark.judge;

import loadmark.response.Loading;

/** What a port shows at one frequency and what a limit says of it. */
record Sample(Loading loading, Reading reading) {
  /** Below this, a signed excess is what rounding leaves of a value that equals its bound. */
  private static final double TOUCH = 1e-13;

  double hz() {
    return loading.hz();
  }

  /** How far past the bound; −∞ where nothing is known. */
  double excess() {
    return reading instanceof Reading.Known known ? known.excess() : Double.NEGATIVE_INFINITY;
  }

  /** The excess drawn together into (−1, 1), with the same sign. */
  double level() {
    return Math.tanh(excess() / 2);
  }

  boolean isKnown() {
    return reading instanceof Reading.Known;
  }

  /** Past the bound, by however little. */
  boolean isPast() {
    return level() > TOUCH;
  }

  /** Past the bound by more than the slack. */
  boolean isBroken() {
    return reading instanceof Reading.Known known && known.broken();
  }

  /** Known, and on the side of the slack that it seems to be on, whatever the error. */
  boolean isSure() {
    return reading instanceof Reading.Known known && known.sure();
  }

  /** Past the bound by more than the slack and than any error. */
  boolean isSurelyBroken() {
    return isBroken() && isSure();
  }

  Worst toWorst() {
    Reading.Known known = (Reading.Known) reading;
    return new Worst(hz(), known.value(), known.valueOhm(), loading.without(), loading.with());
  }
}
