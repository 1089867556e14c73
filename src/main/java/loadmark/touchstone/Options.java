package loadmark.touchstone;

/**
 * What an option line says.
 *
 * @param referenceOhm positive
 * @param stated whether there is such a line
 */
record Options(
    FrequencyUnit unit,
    Parameter parameter,
    Notation notation,
    double referenceOhm,
    boolean stated) {
  /** Of a file without an option line. */
  static final Options DEFAULT =
      new Options(FrequencyUnit.GHZ, Parameter.S, Notation.MA, 50, false);
}
