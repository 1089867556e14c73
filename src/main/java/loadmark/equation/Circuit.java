package loadmark.equation;

import java.util.ArrayList;
import java.util.List;

/**
 * A network with some of its loads on, taken apart into ideal two-terminals.
 *
 * @param nodes how many, with those inside two-terminals of several elements; what is linked is one
 * @param sources where the circuit is driven or measured: first the port, then the places of the
 *     loads that were asked for, each a {@link CircuitBranch.Kind#SHORT} or an {@link
 *     CircuitBranch.Kind#OPEN}
 * @param elements resistors, inductors and capacitors, all of positive value
 */
public record Circuit(int nodes, List<CircuitBranch> sources, List<CircuitBranch> elements) {

  public Circuit {
    sources = List.copyOf(sources);
    elements = List.copyOf(elements);
  }

  /** The same with its port driven by a voltage, so that its current is what answers. */
  public Circuit withPortShort() {
    List<CircuitBranch> changed = new ArrayList<>(sources);
    CircuitBranch port = sources.get(0);
    changed.set(0, new CircuitBranch(CircuitBranch.Kind.SHORT, port.from(), port.to(), 0));
    return new Circuit(nodes, changed, elements);
  }

  /** How many elements store energy. */
  public int reactive() {
    return (int) elements.stream().filter(e -> e.kind().isReactive()).count();
  }
}
