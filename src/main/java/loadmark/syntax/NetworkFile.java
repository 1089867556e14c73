package loadmark.syntax;

import java.util.List;
import loadmark.diagnostic.SourceText;

/** A network file as read: its statements in the order written. */
public record NetworkFile(SourceText source, List<Statement> statements) {
  public NetworkFile {
    statements = List.copyOf(statements);
  }
}
