package loadmark.quantity;

/**
 * A unit with its prefix.
 *
 * @param factor the SI base units in one of it: 1000 for kΩ, 0.01 for %, 1 for a degree
 * @param symbol as it is usually written: {@code kΩ} for {@code kohm}
 */
public record Unit(double factor, Dimension dimension, String symbol) {}
