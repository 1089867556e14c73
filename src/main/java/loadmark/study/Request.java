package loadmark.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What the command line asks for beside the files, as written there.
 *
 * @param sweep in place of the file's own
 * @param at the frequencies of a curve, apart by commas
 * @param sets {@code NAME=VALUE}, each in place of a {@code let}
 * @param port the only port of interest
 * @param caseName the only case of interest
 * @param poles whether a curve's poles and zeros are asked for
 */
public record Request(
    Optional<String> sweep,
    Optional<String> at,
    List<String> sets,
    Optional<String> port,
    Optional<String> caseName,
    boolean poles) {
  public static final Request NOTHING =
      new Request(
          Optional.empty(), Optional.empty(), List.of(), Optional.empty(), Optional.empty(), false);

  public Request {
    sets = List.copyOf(sets);
  }

  /** Each option with its value, for the record in a report. */
  public List<String> options() {
    List<String> options = new ArrayList<>();
    sweep.ifPresent(s -> options.add("--sweep " + s));
    at.ifPresent(a -> options.add("--at " + a));
    port.ifPresent(p -> options.add("--port " + p));
    caseName.ifPresent(c -> options.add("--case " + c));
    sets.forEach(s -> options.add("--set " + s));
    if (poles) {
      options.add("--poles");
    }
    return options;
  }
}
