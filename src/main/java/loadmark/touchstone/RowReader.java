package loadmark.touchstone;

import java.util.Locale;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;

/**
 * Reads rows of data: a frequency and pairs of numbers. A row may be broken between pairs; so a
 * line with an odd number of words begins one, and a line with an even number carries it on.
 */
final class RowReader {
  /** Frequency, least noise figure, source reflection (two numbers), noise resistance. */
  private static final int NOISE_WIDTH = 5;

  private static final Set<String> NOT_FINITE = Set.of("nan", "inf", "infinity");

  private final Lines lines;
  private final OptionLines optionLines;
  private final Layout layout;
  private final Findings findings;
  private final Points points;
  private final FrequencyOrder order;
  private final double[] row;

  /** Those of the current line. */
  private final double[] numbers;

  private final int errorsBefore;
  private int filled;
  private Span rowPlace;
  private int rows;
  private boolean skipping;
  private boolean stopped;

  RowReader(Lines lines, OptionLines optionLines, Layout layout, Findings findings) {
    this.lines = lines;
    this.optionLines = optionLines;
    this.layout = layout;
    this.findings = findings;
    this.points = new Points(layout);
    this.order = new FrequencyOrder(findings);
    this.row = new double[layout.width()];
    this.numbers = new double[layout.width()];
    this.errorsBefore = findings.errorCount();
    this.rowPlace = lines.whole();
  }

  /**
   * Reads from the current line up to a keyword or the end of the text.
   *
   * @return what was read; of use only if there was no error
   */
  Points read() {
    boolean more = lines.count() > 0;
    Span firstPlace = more ? lines.place(0) : lines.whole();
    while (more && !stopped && !lines.isKeyword()) {
      if (lines.isOptions()) {
        stopped = !optionLines.readLate();
      } else {
        readLine();
      }
      stopped |= findings.errorCount() >= errorsBefore + Touchstone.MOST_ERRORS;
      more = lines.next();
    }
    if (filled > 0 && !stopped) {
      reportLength(filled, rowPlace);
    }
    if (findings.errorCount() == errorsBefore) {
      optionLines.warnOfNone(firstPlace);
    }
    return points;
  }

  /** How many rows began, right or wrong. */
  int rows() {
    return rows;
  }

  /** Whether reading ended early. */
  boolean isStopped() {
    return stopped;
  }

  private void readLine() {
    int count = lines.count();
    boolean begins = count % 2 == 1;
    if (skipping && !begins) {
      return;
    }
    if (filled > 0 && (begins || filled + count > row.length)) {
      reportLength(begins ? filled : filled + count, rowPlace);
      if (!begins) {
        return;
      }
    }
    if (stopped || !areNumbers()) {
      return;
    }
    if (filled == 0) {
      if (isNoise(count)) {
        skipNoise();
        return;
      }
      rowPlace = lines.place(0);
      rows++;
      if (!begins || count > row.length) {
        reportLength(count, rowPlace);
        return;
      }
    }
    skipping = false;
    System.arraycopy(numbers, 0, row, filled, count);
    filled += count;
    if (filled == row.length) {
      filled = 0;
      finish();
    }
  }

  private int tenfold(boolean frequency) {
    return frequency ? layout.options().unit().exponent() : 0;
  }

  private void finish() {
    for (int first = 1; first < row.length; first += 2) {
      if (layout.options().notation().refuses(row[first])) {
        findings.error("data-negative-magnitude", rowPlace, "a magnitude in this row is negative");
        return;
      }
    }
    // Adding 0 turns a negative zero into DC.
    row[0] += 0.0;
    if (order.accept(row[0], rowPlace) && !points.add(row)) {
      findings.error("data-out-of-range", rowPlace, "this row is beyond what can be computed with");
    }
  }

  /** One finding on the first word of the line that is no finite number. */
  private boolean areNumbers() {
    boolean begins = lines.count() % 2 == 1;
    for (int i = 0; i < lines.count(); i++) {
      double value = lines.number(i, tenfold(begins && i == 0));
      if (!Double.isFinite(value)) {
        reportWord(i, value);
        filled = 0;
        skipping = true;
        return false;
      }
      if (i < numbers.length) {
        numbers[i] = value;
      }
    }
    return true;
  }

  private void reportWord(int i, double value) {
    String word = lines.quoted(i);
    Span place = lines.place(i);
    if (!Double.isNaN(value)) {
      findings.error("data-out-of-range", place, word + " is beyond what can be computed with");
    } else if (NOT_FINITE.contains(
        lines.word(i).toLowerCase(Locale.ROOT).replaceAll("^[-+]", ""))) {
      findings.error("data-not-finite", place, word + " is no finite number");
    } else if (lines.word(i).indexOf(',') >= 0) {
      findings.error(
          "data-comma",
          place,
          word + " is no number",
          "numbers have a decimal point, and blanks between them");
      // Whoever writes one comma writes them all.
      stopped = true;
    } else if (points.size() == 0) {
      findings.error(
          "data-not-number",
          place,
          word + " is no number",
          "is this a file in the Touchstone format?");
      stopped = true;
    } else {
      findings.error("data-not-number", place, word + " is no number");
    }
  }

  private void reportLength(int numbers, Span place) {
    String message =
        "a row of " + layout.kind() + " has " + row.length + " numbers, this one has " + numbers;
    if (points.size() == 0 && (numbers == 3 || numbers == 9)) {
      findings.error(
          "data-row-length",
          place,
          message,
          "that is a row of " + (numbers == 3 ? "one" : "two") + "-port data: is the name right?");
    } else {
      findings.error("data-row-length", place, message);
    }
    // Where the first row is wrong, all are.
    stopped |= points.size() == 0;
    filled = 0;
    skipping = true;
  }

  private boolean isNoise(int count) {
    return layout.mayHaveNoise()
        && count == NOISE_WIDTH
        && points.size() > 0
        && numbers[0] <= order.lastHz();
  }

  /** Noise data ends a file; of the loading it says nothing. */
  private void skipNoise() {
    do {
      if (lines.count() != NOISE_WIDTH) {
        findings.error(
            "data-row-length",
            lines.place(0),
            "noise data begins above, where the frequency falls; a row of it has "
                + NOISE_WIDTH
                + " numbers, this one has "
                + lines.count());
        stopped = true;
      }
    } while (!stopped && lines.next());
    stopped = true;
  }
}
