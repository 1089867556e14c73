package loadmark.study;

import java.util.List;
import java.util.stream.Stream;
import loadmark.allowance.Amount;
import loadmark.allowance.LoadAllowance;
import loadmark.network.Network;

/**
 * How heavy the loads of a network may be.
 *
 * @param allowances port by port, case by case, load by load
 */
public record AllowanceTable(Network network, List<LoadAllowance> allowances) {
  public AllowanceTable {
    allowances = List.copyOf(allowances);
  }

  /** How many frequencies have an allowance that could not be determined. */
  public long countUndetermined() {
    return allowances.stream()
        .flatMap(a -> a.points().stream())
        .filter(
            p ->
                Stream.of(p.magnitude(), p.resistance(), p.reactive())
                    .anyMatch(Amount.UNDETERMINED::equals))
        .count();
  }
}
