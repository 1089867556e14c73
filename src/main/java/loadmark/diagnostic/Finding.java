package loadmark.diagnostic;

import java.util.Comparator;
import java.util.Optional;

/**
 * Something to tell the user about what they wrote.
 *
 * @param code names the kind of slip, in words joined by hyphens; fixed once published
 * @param message what is wrong, one sentence without the full stop
 * @param hint what to do
 */
public record Finding(
    Severity severity, String code, Span place, String message, Optional<String> hint) {

  /** By the file's name, then line, then column, then in the order found. */
  public static final Comparator<Finding> BY_PLACE =
      Comparator.<Finding, String>comparing(f -> f.place().source().name())
          .thenComparingInt(f -> f.place().line())
          .thenComparingInt(f -> f.place().column());

  /** The code of the finding that says where a source is not read any further. */
  public static final String READING_STOPS = "too-many";

  public boolean isError() {
    return severity == Severity.ERROR;
  }
}
