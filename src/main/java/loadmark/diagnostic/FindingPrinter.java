package loadmark.diagnostic;

import java.util.List;
import java.util.Optional;

/**
 * Writes findings for people: place and message, the line with the slip underlined, the hint.
 *
 * @param colour whether to colour the words for a terminal
 */
public record FindingPrinter(boolean colour) {
  public static final int MOST_SHOWN = 25;

  /** The longest stretch of a line that is shown, in code points. */
  private static final int WINDOW = 90;

  private static final String INDENT = "    ";
  private static final String CUT = "…";
  private static final String BOLD = "\u001b[1m";
  private static final String RED = "\u001b[1;31m";
  private static final String YELLOW = "\u001b[1;33m";
  private static final String PLAIN = "\u001b[0m";

  /** All lines, each ended by LF; empty for no findings. The order is kept. */
  public String print(List<Finding> findings) {
    StringBuilder out = new StringBuilder();
    findings.stream().limit(MOST_SHOWN).forEach(finding -> print(finding, out));
    int more = findings.size() - MOST_SHOWN;
    if (more > 0) {
      Optional<Finding> stop = findStop(findings);
      out.append("… and ").append(stop.isPresent() ? "at least " : "").append(more);
      out.append(more == 1 ? " more finding" : " more findings");
      stop.ifPresent(
          finding ->
              out.append(": after so many errors ")
                  .append(Printable.of(finding.place().source().name()))
                  .append(" is not read from line ")
                  .append(finding.place().line())
                  .append(" on"));
      out.append('\n');
    }
    return out.toString();
  }

  /** The finding that says where reading stopped, so that there may be more than are known. */
  public static Optional<Finding> findStop(List<Finding> findings) {
    return findings.stream().filter(f -> f.code().equals(Finding.READING_STOPS)).findFirst();
  }

  private void print(Finding finding, StringBuilder out) {
    Span place = finding.place();
    String where =
        Printable.of(place.source().name()) + ":" + place.line() + ":" + place.column() + ":";
    out.append(styled(BOLD, where)).append(' ');
    out.append(styled(tint(finding), finding.severity().word() + ":")).append(' ');
    out.append(Printable.of(finding.message())).append('\n');
    place.source().findLine(place.line()).ifPresent(line -> quote(line, finding, out));
    finding
        .hint()
        .ifPresent(
            hint ->
                out.append(styled(BOLD, "hint:"))
                    .append(' ')
                    .append(Printable.of(hint))
                    .append('\n'));
  }

  private void quote(String line, Finding finding, StringBuilder out) {
    int[] text = Printable.of(line).codePoints().toArray();
    int start = Math.min(finding.place().column() - 1, text.length);
    int end = Math.min(text.length, start + finding.place().length());
    int from = text.length <= WINDOW || start < WINDOW / 2 ? 0 : start - WINDOW / 2;
    int to = Math.min(text.length, from + WINDOW);
    String before = from > 0 ? CUT : "";
    out.append(INDENT).append(before).append(new String(text, from, to - from));
    out.append(to < text.length ? CUT : "").append('\n');

    // Tabs are kept, so that the mark stands below the slip however wide they are shown.
    StringBuilder mark = new StringBuilder(before.replace(CUT, " "));
    for (int i = from; i < start; i++) {
      mark.append(text[i] == '\t' ? '\t' : ' ');
    }
    StringBuilder underline = new StringBuilder("^");
    underline.append("~".repeat(Math.max(0, Math.min(end, to) - start - 1)));
    out.append(INDENT).append(mark).append(styled(tint(finding), underline.toString()));
    out.append('\n');
  }

  private static String tint(Finding finding) {
    return finding.isError() ? RED : YELLOW;
  }

  private String styled(String style, String text) {
    return colour ? style + text + PLAIN : text;
  }
}
