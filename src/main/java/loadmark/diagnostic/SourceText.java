package loadmark.diagnostic;

import java.util.List;
import java.util.Optional;

/**
 * A text that was read, with the name it goes by in findings.
 *
 * @param name the path as the user gave it, or {@code -} for standard input
 * @param text the whole text
 */
public record SourceText(String name, String text) {

  /**
   * A source that could not be read, so that a finding on it still has a place: line 1, column 1.
   */
  public static SourceText unread(String name) {
    return new SourceText(name, "");
  }

  /** The lines without their ends; LF, CRLF and CR end one. */
  public List<String> lines() {
    return text.lines().toList();
  }

  /** One line without its end, from 1; empty behind the last. */
  public Optional<String> findLine(int line) {
    return text.lines().skip(line - 1L).findFirst();
  }

  /** The last character; line 1, column 1 of an empty text. */
  public Span end() {
    List<String> lines = lines();
    if (lines.isEmpty()) {
      return whole();
    }
    String last = lines.get(lines.size() - 1);
    int columns = last.codePointCount(0, last.length());
    return new Span(this, lines.size(), Math.max(1, columns), Math.min(1, columns));
  }

  /** The place of a finding on the whole file. */
  public Span whole() {
    return new Span(this, 1, 1, 0);
  }

  @Override
  public boolean equals(Object other) {
    return this == other;
  }

  @Override
  public int hashCode() {
    return System.identityHashCode(this);
  }

  @Override
  public String toString() {
    return name;
  }
}
