package loadmark.network;

import java.util.List;
import java.util.Optional;

/**
 * A network, its loads and what is judged. Immutable; made by binding alone, which has checked it.
 *
 * @param title empty where the file gives none
 * @param nodes ground first
 * @param cases in the order of judging
 * @param sweep empty where every limit names its own frequencies
 */
public record Network(
    String title,
    List<Node> nodes,
    List<Part> parts,
    List<Supply> supplies,
    List<Port> ports,
    List<Load> loads,
    List<Case> cases,
    List<Limit> limits,
    Optional<Sweep> sweep) {

  public Network {
    nodes = List.copyOf(nodes);
    parts = List.copyOf(parts);
    supplies = List.copyOf(supplies);
    ports = List.copyOf(ports);
    loads = List.copyOf(loads);
    cases = List.copyOf(cases);
    limits = List.copyOf(limits);
  }
}
