package loadmark.response;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import loadmark.equation.Circuit;
import loadmark.equation.CircuitBuilder;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.Port;

/** What a port does with a case's loads and with its reference's, as state spaces in ζ. */
final class PortSystems {
  private final Circuit with;
  private final Circuit without;
  private final int changed;

  PortSystems(Network network, Port port, List<Load> loads, List<Load> against) {
    Set<Load> differing = new HashSet<>(loads);
    differing.addAll(against);
    List<Load> places = new ArrayList<>();
    for (Load load : network.loads()) {
      if (differing.contains(load) && loads.contains(load) != against.contains(load)) {
        places.add(load);
      }
    }
    with = CircuitBuilder.build(network, port, loads, places);
    without = CircuitBuilder.build(network, port, against, places);
    changed = places.size();
  }

  /** How many elements store energy, with the case's loads and with its reference's. */
  int reactive() {
    return Math.max(with.reactive(), without.reactive());
  }

  /** All elements of the larger of the two. */
  int elements() {
    return Math.max(with.elements().size(), without.elements().size());
  }

  /** Z_with, Ω. */
  StateSpace impedance(double s0) {
    return impedance(with, s0);
  }

  /** Z of a two-terminal, Ω. */
  static StateSpace impedance(OnePort alone, double s0) {
    return impedance(CircuitBuilder.build(alone), s0);
  }

  /** 1/Z of a two-terminal, S. */
  static StateSpace admittance(OnePort alone, double s0) {
    return admittance(CircuitBuilder.build(alone), s0);
  }

  private static StateSpace admittance(Circuit circuit, double s0) {
    return WaveRealisation.of(circuit.withPortShort(), s0).part(0, 0, -1);
  }

  private static StateSpace impedance(Circuit circuit, double s0) {
    return WaveRealisation.of(circuit, s0).part(0, 0, -1);
  }

  /** What Re(1/Z_with) is the sum of the squares of, √S: an output a resistor. */
  StateSpace admittanceParts(double s0) {
    return WaveRealisation.powers(with.withPortShort(), s0);
  }

  /** 1/Z_with, S. */
  StateSpace admittance(double s0) {
    return admittance(with, s0);
  }

  /**
   * Z_with/Z_without − 1, or Z_with − Z_without in Ω, as a product: what the driven reference shows
   * at the places of the loads, each acting in the loaded network as a source there that stands for
   * the difference (the compensation theorem), and what those sources do to the open port. Nothing
   * is subtracted, so that small changes come out as well as large ones.
   *
   * @param inOhm whether the reference's port is driven by 1 A instead of 1 V
   */
  StateSpace change(boolean inOhm, double s0) {
    if (changed == 0) {
      return StateSpace.zero();
    }
    StateSpace reference = WaveRealisation.of(inOhm ? without : without.withPortShort(), s0);
    StateSpace loaded = WaveRealisation.of(with, s0);
    StateSpace seen = reference.part(1, 1 + changed, 0, 1, inOhm ? -1 : 1);
    return seen.into(loaded.part(0, 1, 1, 1 + changed, -1));
  }
}
