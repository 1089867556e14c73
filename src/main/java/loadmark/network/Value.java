package loadmark.network;

/**
 * An element's value and its tolerance.
 *
 * @param nominal in the element's SI unit; positive, or 0 for a resistor that is a link
 * @param low the lowest value a delivered part may have
 * @param high the highest
 */
public record Value(double nominal, double low, double high) {

  public Value {
    if (!(0 <= low && low <= nominal && nominal <= high && Double.isFinite(high))) {
      throw new IllegalArgumentException(low + " <= " + nominal + " <= " + high);
    }
  }

  public static Value exact(double nominal) {
    return new Value(nominal, nominal, nominal);
  }
}
