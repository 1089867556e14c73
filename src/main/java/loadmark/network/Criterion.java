package loadmark.network;

/** What a limit bounds. The unit is that of bounds and values in every output. */
public enum Criterion {
  /** |Z_with − Z_without| / |Z_without|; or, in Ω, |Z_with − Z_without|. */
  CHANGE("change", false),
  /** | |Z_with| − |Z_without| | / |Z_without|. */
  MAGNITUDE_CHANGE("magnitude change", false),
  /** Change of the phase, in degrees, without its sign. */
  PHASE_CHANGE("phase change", false),
  /** |Z_with|, Ω. */
  MAGNITUDE("magnitude", true),
  /** Phase of Z_with, degrees. */
  PHASE("phase", true),
  /** | |Z_with|/|Z_ref| − 1 |. */
  MAGNITUDE_WITHIN("magnitude within", true),
  /** |arg(Z_with/Z_ref)|, degrees. */
  PHASE_WITHIN("phase within", true),
  /** Im(1/Z_with)/ω, F. */
  PARALLEL_CAPACITANCE("parallel capacitance", true),
  /** 1/Re(1/Z_with), Ω. */
  PARALLEL_RESISTANCE("parallel resistance", true),
  /** 20·log10 |(Z_with + Z_r)/(Z_with − Z_r)|, dB. */
  RETURN_LOSS("return loss", true);

  private final String words;
  private final boolean absolute;

  Criterion(String words, boolean absolute) {
    this.words = words;
    this.absolute = absolute;
  }

  /** As written in the language and in JSON. */
  public String words() {
    return words;
  }

  /** Whether the loaded network alone decides, so that the bare one has a verdict too. */
  public boolean isAbsolute() {
    return absolute;
  }
}
