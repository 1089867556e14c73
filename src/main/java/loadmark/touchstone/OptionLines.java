package loadmark.touchstone;

import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;

/** The option lines of a file, of which the first counts. */
final class OptionLines {
  private final Lines lines;
  private final Findings findings;
  private Options options = Options.DEFAULT;
  private boolean stated;
  private boolean repeated;

  OptionLines(Lines lines, Findings findings) {
    this.lines = lines;
    this.findings = findings;
  }

  /** What the file says; the defaults where it says nothing. */
  Options options() {
    return options;
  }

  /** Takes in the current line, which is an option line above the data. */
  void read() {
    if (stated) {
      warnOfSecond();
    } else {
      stated = true;
      options = OptionLine.read(lines, findings);
    }
  }

  /**
   * Takes in the current line, which is an option line within the data.
   *
   * @return whether the data may go on
   */
  boolean readLate() {
    if (stated) {
      warnOfSecond();
    } else {
      findings.error(
          "data-late-options", lines.place(0), "an option line stands before the data it is about");
    }
    return stated;
  }

  private void warnOfSecond() {
    if (!repeated) {
      findings.warning(
          "data-second-options", lines.place(0), "only the first option line of a file counts");
    }
    repeated = true;
  }

  /** Tells what was assumed where the file says nothing. */
  void warnOfNone(Span data) {
    if (!stated) {
      findings.warning(
          "data-no-options",
          data,
          "there is no option line above the data: it is read as `# GHz S MA R 50`",
          "say so in the file, or say what it is");
    }
  }
}
