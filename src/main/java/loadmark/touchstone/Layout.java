package loadmark.touchstone;

import java.util.Collections;
import java.util.List;

/**
 * How the rows of a file are to be read.
 *
 * @param normalised whether Y and Z are divided by those of the reference, and noise data may
 *     follow two-port data: version 1.1
 * @param referenceOhm one a port
 */
record Layout(Options options, boolean normalised, Order order, List<Double> referenceOhm) {
  Layout {
    referenceOhm = List.copyOf(referenceOhm);
    if (referenceOhm.size() != order.ports()) {
      throw new IllegalArgumentException(order + ": " + referenceOhm);
    }
  }

  /** Version 1.1: one reference for all ports. */
  static Layout old(Options options, int ports) {
    return new Layout(
        options,
        true,
        ports == 1 ? Order.ONE_PORT : Order.COLUMNS,
        Collections.nCopies(ports, options.referenceOhm()));
  }

  /** Numbers in a row: the frequency and the pairs. */
  int width() {
    return 1 + 2 * order.pairs();
  }

  boolean mayHaveNoise() {
    return normalised && order.ports() == 2;
  }

  /** {@code one-port data}, for messages. */
  String kind() {
    return (order.ports() == 1 ? "one" : "two") + "-port data";
  }

  /**
   * The largest factor that separates a number from the coefficients of the relation that is made
   * of it.
   */
  double largestFactor() {
    double largest = Collections.max(referenceOhm);
    return Math.max(1, Math.max(largest, Math.sqrt(largest / Collections.min(referenceOhm))));
  }
}
