package loadmark.diagnostic;

import java.util.List;

/** Findings for people. Stand-in. */
public final class FindingPrinter {
  public static final int MOST = 25;

  private FindingPrinter() {}

  public static String print(List<Finding> findings) {
    StringBuilder text = new StringBuilder();
    for (Finding f : findings.subList(0, Math.min(MOST, findings.size()))) {
      text.append(f.place().source().name()).append(':').append(f.place().line());
      text.append(':').append(f.place().column()).append(": ");
      text.append(f.severity().word()).append(": ").append(f.message()).append('\n');
      List<String> lines = f.place().source().lines();
      if (f.place().line() <= lines.size() && f.place().length() > 0) {
        text.append("  ").append(lines.get(f.place().line() - 1)).append("\n  ");
        text.append(" ".repeat(f.place().column() - 1)).append("^".repeat(f.place().length()));
        text.append('\n');
      }
      f.hint().ifPresent(h -> text.append("  hint: ").append(h).append('\n'));
    }
    if (findings.size() > MOST) {
      text.append("and ").append(findings.size() - MOST).append(" more\n");
    }
    return text.toString();
  }
}
