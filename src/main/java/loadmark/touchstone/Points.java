package loadmark.touchstone;

import java.util.Arrays;

/** Collects rows of numbers as points. */
final class Points {
  /** Room for a sum of two values, and for the sums within a complex number. */
  private static final double ROOM = 8;

  private final Layout layout;
  private final double largestFactor;
  private final int stride;
  private double[] hz = new double[64];
  private double[] values;
  private int size;

  Points(Layout layout) {
    this.layout = layout;
    this.largestFactor = ROOM * layout.largestFactor();
    this.stride = 2 * layout.order().entries();
    this.values = new double[hz.length * stride];
  }

  int size() {
    return size;
  }

  /**
   * Adds a point.
   *
   * @param row the frequency in Hz, then pairs as in the file; finite
   * @return whether its values and all that is made of them are doubles; if not, it is not added
   */
  boolean add(double[] row) {
    makeRoom();
    Options options = layout.options();
    int at = size * stride;
    for (int entry = 0; entry < layout.order().entries(); entry++) {
      int pair = layout.order().pairOf(entry);
      double first = row[1 + 2 * pair];
      double second = row[2 + 2 * pair];
      double re = inUnits(options.notation().re(first, second));
      double im = inUnits(options.notation().im(first, second));
      if (!Double.isFinite((1 + Math.abs(re) + Math.abs(im)) * largestFactor)) {
        return false;
      }
      values[at++] = re;
      values[at++] = im;
    }
    hz[size++] = row[0];
    return true;
  }

  private double inUnits(double value) {
    Options options = layout.options();
    return layout.normalised()
        ? options.parameter().denormalised(value, options.referenceOhm())
        : value;
  }

  private void makeRoom() {
    if (size == hz.length) {
      hz = Arrays.copyOf(hz, 2 * size);
      values = Arrays.copyOf(values, 2 * size * stride);
    }
  }

  /** All so far; at least one. */
  MeasuredData toData() {
    return new MeasuredData(
        layout.options().parameter(),
        layout.referenceOhm(),
        Arrays.copyOf(hz, size),
        Arrays.copyOf(values, size * stride));
  }
}
