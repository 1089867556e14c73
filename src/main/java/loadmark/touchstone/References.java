package loadmark.touchstone;

import java.util.Optional;
import loadmark.diagnostic.Findings;

/** Reads reference resistances. */
final class References {
  private References() {}

  /** The resistance that a word of the current line gives, Ω; empty, with a finding, if none. */
  static Optional<Double> read(Lines lines, int i, Findings findings) {
    double ohm = lines.number(i, 0);
    if (ohm > 0 && Double.isFinite(ohm)) {
      return Optional.of(ohm);
    }
    findings.error(
        "data-reference",
        lines.place(i),
        lines.quoted(i) + " is no reference resistance: a positive number of ohm is expected");
    return Optional.empty();
  }
}
