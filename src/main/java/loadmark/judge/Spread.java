package loadmark.judge;

/**
 * How far the true excess may lie from the one that was found, without unit and of 0 or more;
 * infinite where nothing is known.
 *
 * @param up how much larger it may be
 * @param down how much smaller
 */
record Spread(double up, double down) {
  static final Spread NONE = new Spread(0, 0);

  /** The same to both sides. */
  static Spread of(double error) {
    double size = Double.isNaN(error) ? Double.POSITIVE_INFINITY : Math.abs(error);
    return new Spread(size, size);
  }

  /** Of the logarithm of a value of 0 or more with a relative error. */
  static Spread ofLogarithm(double relative) {
    double size = Spread.of(relative).up;
    return new Spread(Math.log1p(size), size < 1 ? -Math.log1p(-size) : Double.POSITIVE_INFINITY);
  }

  /** Of the logarithm of the value's inverse. */
  Spread turned() {
    return new Spread(down, up);
  }

  /** Of what has either. */
  Spread or(Spread other) {
    return new Spread(Math.max(up, other.up), Math.max(down, other.down));
  }

  boolean isKnown() {
    return up < Double.POSITIVE_INFINITY;
  }
}
