package loadmark.binding;

import java.util.List;
import loadmark.diagnostic.Span;

/** What the user wrote, word for word. */
final class Texts {
  private Texts() {}

  /** The text of a span, as far as it stands on its line. */
  static String of(Span span) {
    List<String> lines = span.source().lines();
    if (span.line() > lines.size()) {
      return "";
    }
    String line = lines.get(span.line() - 1);
    int length = line.codePointCount(0, line.length());
    int from = Math.min(span.column() - 1, length);
    int to = Math.min(from + span.length(), length);
    return line.substring(line.offsetByCodePoints(0, from), line.offsetByCodePoints(0, to));
  }

  /** The first line of a statement, from its first word, without its comment. */
  static String statement(Span span) {
    return of(span).strip();
  }
}
