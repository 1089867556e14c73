package loadmark.study;

import loadmark.judge.Verdict;

/** What a whole run ends with, in rising weight. The exit status of several files is here alone. */
public enum Outcome {
  KEPT("kept", 0),
  UNDETERMINED("undetermined", 2),
  BROKEN("broken", 1),
  INVALID("invalid", 2);

  private final String word;
  private final int status;

  Outcome(String word, int status) {
    this.word = word;
    this.status = status;
  }

  public static Outcome of(Verdict verdict) {
    return switch (verdict) {
      case KEPT -> KEPT;
      case UNDETERMINED -> UNDETERMINED;
      case BROKEN -> BROKEN;
    };
  }

  /** The heavier of the two: invalid, then broken, then undetermined, then kept. */
  public Outcome and(Outcome other) {
    return compareTo(other) >= 0 ? this : other;
  }

  public String word() {
    return word;
  }

  /** The exit status of a run that ends so. */
  public int status() {
    return status;
  }
}
