package loadmark.equation;

/**
 * A place where the case and its reference differ.
 *
 * @param series whether its loads stand in series with the rest, so that their impedance is what is
 *     added; else their admittance
 * @param without what stands there in the reference
 * @param with what stands there in the case
 */
public record ChangedPlace(int first, int second, boolean series, Law without, Law with) {}
