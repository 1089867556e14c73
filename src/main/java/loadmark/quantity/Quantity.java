package loadmark.quantity;

/**
 * A value with its dimension.
 *
 * @param value in SI base units; an angle in degrees, a level in decibels, a ratio as a plain
 *     number
 */
public record Quantity(double value, Dimension dimension) {}
