package loadmark.binding;

import java.util.Map;
import java.util.Optional;
import loadmark.syntax.Expression;
import loadmark.syntax.Statement;

/** What the command line puts in place of the file's own. Stand-in. */
public record Overrides(Optional<Statement.Sweep> sweep, Map<String, Expression> lets) {
  public Overrides {
    lets = Map.copyOf(lets);
  }
}
