package loadmark.binding;

import java.util.Map;
import java.util.Optional;
import loadmark.syntax.Expression;
import loadmark.syntax.Statement;

/**
 * What the command line puts in the place of what the file says.
 *
 * @param sweep in place of the file's sweep; limits that then fall outside are skipped and named
 * @param lets values by the name of the {@code let} they replace
 */
public record Overrides(Optional<Statement.Sweep> sweep, Map<String, Expression> lets) {
  public static final Overrides NONE = new Overrides(Optional.empty(), Map.of());

  public Overrides {
    lets = Map.copyOf(lets);
  }
}
