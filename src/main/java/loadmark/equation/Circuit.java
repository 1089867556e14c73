package loadmark.equation;

import java.util.ArrayList;
import java.util.List;

/**
 * A network with some of its loads on, taken apart into ideal two-terminals.
 *
 * @param nodes how many, with those inside two-terminals of several elements; what is linked is one
 * @param sources where the circuit is driven or measured: first the port, then the places of the
 *     loads that were asked for, each a {@link Branch.Kind#SHORT} or an {@link Branch.Kind#OPEN}
 * @param elements resistors, inductors and capacitors, all of positive value
 */
public record Circuit(int nodes, List<Branch> sources, List<Branch> elements) {

  public Circuit {
    sources = List.copyOf(sources);
    elements = List.copyOf(elements);
  }

  /** The same with its port driven by a voltage, so that its current is what answers. */
  public Circuit withPortShort() {
    List<Branch> changed = new ArrayList<>(sources);
    Branch port = sources.get(0);
    changed.set(0, new Branch(Branch.Kind.SHORT, port.from(), port.to(), 0));
    return new Circuit(nodes, changed, elements);
  }

  /** How many elements store energy. */
  public int reactive() {
    return (int) elements.stream().filter(e -> e.kind().isReactive()).count();
  }
}
