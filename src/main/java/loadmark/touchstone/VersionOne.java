package loadmark.touchstone;

import java.util.Optional;
import java.util.OptionalInt;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import loadmark.diagnostic.Findings;

/** Reads version 1.1: an option line and rows. How many ports there are, the file's name says. */
final class VersionOne {
  private static final Pattern NAME = Pattern.compile(".*\\.[sS](\\d+)[pP]", Pattern.DOTALL);
  private static final int MOST_PORT_DIGITS = 6;

  private final Lines lines;
  private final String name;
  private final Findings findings;

  /**
   * A reader.
   *
   * @param name of the file
   */
  VersionOne(Lines lines, String name, Findings findings) {
    this.lines = lines;
    this.name = name;
    this.findings = findings;
  }

  /** Reads from the current line on; empty where there are no rows to be read. */
  Optional<Points> read() {
    OptionLines optionLines = new OptionLines(lines, findings);
    boolean more = true;
    while (more && lines.isOptions()) {
      optionLines.read();
      more = lines.next();
    }
    if (lines.count() == 0) {
      findings.error("data-empty", lines.end(), "the file has no data");
      return Optional.empty();
    }
    if (lines.isKeyword()) {
      reportKeyword();
      return Optional.empty();
    }
    OptionalInt ports = findPorts();
    if (ports.isEmpty()) {
      return Optional.empty();
    }
    Layout layout = Layout.old(optionLines.options(), ports.getAsInt());
    RowReader rows = new RowReader(lines, optionLines, layout, findings);
    Points points = rows.read();
    if (!rows.isStopped() && lines.count() > 0) {
      reportKeyword();
    }
    return Optional.of(points);
  }

  private void reportKeyword() {
    findings.error(
        "data-no-version",
        lines.place(0),
        lines.quoted(0) + " belongs to version 2.0",
        "such a file begins with `[Version] 2.0`");
  }

  private OptionalInt findPorts() {
    Matcher named = NAME.matcher(name);
    if (named.matches()) {
      String digits = named.group(1);
      int ports = digits.length() > MOST_PORT_DIGITS ? 0 : Integer.parseInt(digits);
      if (ports == 1 || ports == 2) {
        return OptionalInt.of(ports);
      }
      findings.error(
          "data-ports",
          lines.whole(),
          "the name says that this is data of " + digits + " ports: one or two are read");
      return OptionalInt.empty();
    }
    return findPortsInRow();
  }

  private OptionalInt findPortsInRow() {
    if (Double.isNaN(lines.number(0, 0))) {
      // No row at all, however many ports: whoever reads it says so.
      return OptionalInt.of(1);
    }
    for (int ports = 1; ports <= 2; ports++) {
      if (lines.count() == Layout.old(Options.DEFAULT, ports).width()) {
        return OptionalInt.of(ports);
      }
    }
    findings.error(
        "data-ports",
        lines.place(0),
        "neither the name nor this row says how many ports there are",
        "let the name end in .s1p or .s2p");
    return OptionalInt.empty();
  }
}
