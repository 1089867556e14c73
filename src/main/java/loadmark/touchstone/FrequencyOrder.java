package loadmark.touchstone;

import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;

/** Watches over frequencies, which must rise. A run of rows that fall is told once. */
final class FrequencyOrder {
  private final Findings findings;
  private double lastHz = Double.NEGATIVE_INFINITY;
  private boolean falling;
  private boolean standing;

  FrequencyOrder(Findings findings) {
    this.findings = findings;
  }

  /** The frequency of the last row, Hz. */
  double lastHz() {
    return lastHz;
  }

  /** Whether a row may follow the last one. */
  boolean accept(double hz, Span place) {
    boolean wasFalling = falling;
    boolean wasStanding = standing;
    falling = hz < lastHz;
    standing = hz == lastHz;
    lastHz = hz;
    if (hz < 0) {
      findings.error("data-frequency", place, "a frequency is negative");
      return false;
    }
    if (falling && !wasFalling) {
      findings.error(
          "data-frequency-order",
          place,
          "this frequency is lower than the one before it",
          "rows stand in rising frequency");
    }
    if (standing && !wasStanding) {
      findings.error("data-frequency-twice", place, "this frequency is the one before it again");
    }
    return !falling && !standing;
  }
}
