package loadmark.diagnostic;

/** How grave a finding is. An error keeps a file from being judged. */
public enum Severity {
  ERROR,
  WARNING;

  /** The word for people and for JSON. */
  public String word() {
    return this == ERROR ? "error" : "warning";
  }
}
