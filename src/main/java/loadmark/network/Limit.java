package loadmark.network;

import java.util.List;
import java.util.Optional;

/**
 * One limit with its scope, as it is judged.
 *
 * @param reference the impedance of {@code within … of} and {@code return loss … in}
 * @param referenceText that impedance as the user wrote it, else empty
 * @param scope the frequencies where it holds, already cut to the sweep: sorted, apart, at least
 *     one
 * @param cases those it holds for
 * @param ports those it holds at
 * @param text the line as the user wrote it, without comment
 */
public record Limit(
    Criterion criterion,
    Bound bound,
    Optional<OnePort> reference,
    String referenceText,
    List<Band> scope,
    List<Case> cases,
    List<Port> ports,
    int line,
    String text) {

  public Limit {
    scope = List.copyOf(scope);
    cases = List.copyOf(cases);
    ports = List.copyOf(ports);
    if (scope.isEmpty()) {
      throw new IllegalArgumentException("a limit without frequencies: " + text);
    }
  }

  public boolean holdsFor(Case one, Port port) {
    return cases.contains(one) && ports.contains(port);
  }
}
