package loadmark.allowance;

/**
 * What the limits on the change leave room for at one frequency: the tightest of those in whose
 * scope it lies.
 *
 * @param magnitude Ω: of a shunt load the least, of a series load the largest |Z| that is safe at
 *     every phase from −90° to 90°
 * @param resistance Ω: of a resistor alone the least (shunt) or the largest (series)
 * @param reactive of a capacitor alone the largest, F (shunt); of an inductor alone the largest, H
 *     (series)
 */
public record PointAllowance(double hz, Amount magnitude, Amount resistance, Amount reactive) {}
