package loadmark.response;

/**
 * What a port shows at one frequency, with a case's loads against its reference.
 *
 * @param hz 0 for DC
 * @param without the impedance of the reference
 * @param with the impedance with the case's loads
 * @param change the relative change between them
 * @param withoutError estimate of the relative error of {@code without}; infinite where unknown
 * @param withError the same for {@code with}
 * @param changeError the same for {@code change}
 */
public record Loading(
    double hz,
    Ohms without,
    Ohms with,
    Change change,
    double withoutError,
    double withError,
    double changeError) {}
