package loadmark.judge;

/** What is said of a limit, a case, a port or a file. */
public enum Verdict {
  KEPT("kept"),
  /** Nothing is broken, but something could not be determined. */
  UNDETERMINED("undetermined"),
  BROKEN("broken");

  private final String word;

  Verdict(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }

  /** The graver of the two: broken, then undetermined, then kept. */
  public Verdict and(Verdict other) {
    return compareTo(other) >= 0 ? this : other;
  }
}
