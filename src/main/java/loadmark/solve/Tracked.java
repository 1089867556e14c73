package loadmark.solve;

import java.util.Arrays;

/**
 * Complex numbers, one for each frequency of a block, each with a running bound of its relative
 * error in units of 2⁻⁵³ (Wilkinson, Error analysis revisited, 1986).
 */
final class Tracked {
  final double[] re;
  final double[] im;
  final double[] error;

  Tracked(int size) {
    this(new double[size], new double[size], new double[size]);
  }

  /** A view of arrays that belong to another. */
  Tracked(double[] re, double[] im, double[] error) {
    this.re = re;
    this.im = im;
    this.error = error;
  }

  void set(double real) {
    Arrays.fill(re, real);
    Arrays.fill(im, 0);
    Arrays.fill(error, 0);
  }
}
