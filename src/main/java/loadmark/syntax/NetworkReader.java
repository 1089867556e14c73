package loadmark.syntax;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;

/** Text to syntax tree. Stand-in. */
public final class NetworkReader {
  private NetworkReader() {}

  public static NetworkFile read(SourceText source, Findings findings) {
    if (source.text().isBlank()) {
      findings.error("no-statements", source.whole(), "this file says nothing");
    }
    return new NetworkFile(source, List.of());
  }

  public static Optional<Statement.Sweep> readSweep(SourceText source, Findings findings) {
    if (!source.text().contains("to")) {
      findings.error("sweep", source.whole(), "not a sweep");
    }
    return Optional.empty();
  }

  public static Optional<List<Expression>> readExpressions(SourceText source, Findings findings) {
    return Optional.of(List.of());
  }

  public static Optional<Expression> readExpression(SourceText source, Findings findings) {
    return Optional.of(new Expression.Literal("1", 1, Optional.empty(), false, source.whole()));
  }
}
