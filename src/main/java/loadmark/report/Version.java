package loadmark.report;

/** The version of the tool. */
public final class Version {
  public static final String CURRENT = "0.1.0";

  private Version() {}
}
