package loadmark.touchstone;

/**
 * What an option line says.
 *
 * @param referenceOhm positive
 */
record Options(FrequencyUnit unit, Parameter parameter, Notation notation, double referenceOhm) {
  /** Of a file without an option line. */
  static final Options DEFAULT = new Options(FrequencyUnit.GHZ, Parameter.S, Notation.MA, 50);
}
