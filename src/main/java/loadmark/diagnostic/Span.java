package loadmark.diagnostic;

/**
 * A stretch of one line of a source.
 *
 * @param source where it stands
 * @param line from 1
 * @param column from 1, in code points
 * @param length in code points; 0 for a place between characters
 */
public record Span(SourceText source, int line, int column, int length) {

  public Span {
    if (line < 1 || column < 1 || length < 0) {
      throw new IllegalArgumentException("line " + line + ", column " + column + ": " + length);
    }
  }

  /**
   * From the start of this to the end of {@code last}; to the end of this where that is on another
   * line.
   */
  public Span to(Span last) {
    return last.line == line && last.source.equals(source)
        ? new Span(source, line, column, Math.max(length, last.column + last.length - column))
        : this;
  }
}
