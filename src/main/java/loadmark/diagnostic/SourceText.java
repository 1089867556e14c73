package loadmark.diagnostic;

import java.util.List;

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

  /** The lines without their ends; LF and CRLF both end one. */
  public List<String> lines() {
    return text.lines().toList();
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
