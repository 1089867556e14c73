package loadmark.equation;

import java.util.DoubleSummaryStatistics;

/**
 * The slowest and the fastest rate (rad/s) that two elements of a circuit have together: 1/RC, R/L
 * or 1/√(LC). All its natural frequencies but 0 and infinity lie between, give or take a factor of
 * the number of elements.
 */
public record Rates(double slowest, double fastest) {

  /** The rates of a circuit; both 1 where it has none. */
  public static Rates of(Circuit circuit) {
    DoubleSummaryStatistics r = values(circuit, CircuitBranch.Kind.RESISTOR);
    DoubleSummaryStatistics l = values(circuit, CircuitBranch.Kind.INDUCTOR);
    DoubleSummaryStatistics c = values(circuit, CircuitBranch.Kind.CAPACITOR);
    DoubleSummaryStatistics rates = new DoubleSummaryStatistics();
    if (r.getCount() > 0 && c.getCount() > 0) {
      rates.accept(1 / r.getMax() / c.getMax());
      rates.accept(1 / r.getMin() / c.getMin());
    }
    if (r.getCount() > 0 && l.getCount() > 0) {
      rates.accept(r.getMin() / l.getMax());
      rates.accept(r.getMax() / l.getMin());
    }
    if (l.getCount() > 0 && c.getCount() > 0) {
      rates.accept(1 / Math.sqrt(l.getMax()) / Math.sqrt(c.getMax()));
      rates.accept(1 / Math.sqrt(l.getMin()) / Math.sqrt(c.getMin()));
    }
    return rates.getCount() > 0 ? new Rates(rates.getMin(), rates.getMax()) : new Rates(1, 1);
  }

  /** Wider by a factor at both ends. */
  public Rates widened(double factor) {
    return new Rates(slowest / factor, fastest * factor);
  }

  private static DoubleSummaryStatistics values(Circuit circuit, CircuitBranch.Kind kind) {
    return circuit.elements().stream()
        .filter(element -> element.kind() == kind)
        .mapToDouble(CircuitBranch::value)
        .summaryStatistics();
  }
}
