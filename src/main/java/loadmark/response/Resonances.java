package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loadmark.equation.Circuit;
import loadmark.equation.CircuitBuilder;
import loadmark.equation.LoadFactor;
import loadmark.equation.Rates;
import loadmark.network.Band;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;

/** The resonances of a port, each followed while the loads go from the reference to the case. */
public final class Resonances {
  /** Roots may leave the band by this factor and still be followed. */
  private static final double BEYOND = 100;

  private final Network network;
  private final Port port;
  private final List<Load> loads;
  private final List<Load> against;
  private final Rates range;

  private Resonances(Network network, Port port, List<Load> loads, List<Load> against, Band band) {
    this.network = network;
    this.port = port;
    this.loads = loads;
    this.against = against;
    range = new Rates(2 * Math.PI * band.fromHz(), 2 * Math.PI * band.toHz()).widened(BEYOND);
  }

  /**
   * Those whose |s|/2π lies in the band, with the case's loads or with the reference's. A load of
   * the case alone grows from nothing to itself, one of the reference alone shrinks to nothing.
   *
   * @param band positive frequencies
   * @throws ArithmeticException where eigenvalues did not come out
   */
  public static List<Resonance> of(
      Network network, Port port, List<Load> loads, List<Load> against, Band band) {
    Resonances all = new Resonances(network, port, loads, against, band);
    List<Resonance> found = new ArrayList<>();
    PortRoots without = PortRoots.of(network, port, against);
    PortRoots with = PortRoots.of(network, port, loads);
    found.addAll(all.follow(Resonance.Kind.POLE, without.poles(), with.poles()));
    found.addAll(all.follow(Resonance.Kind.ZERO, without.zeros(), with.zeros()));
    return found.stream().filter(r -> isIn(band, r.without()) || isIn(band, r.with())).toList();
  }

  private static boolean isIn(Band band, Optional<Complex> root) {
    return root.map(s -> s.abs() / (2 * Math.PI))
        .filter(hz -> band.fromHz() <= hz && hz <= band.toHz())
        .isPresent();
  }

  private List<Resonance> follow(Resonance.Kind kind, List<Complex> from, List<Complex> to) {
    List<Complex> ends = new ArrayList<>(to.stream().filter(Resonance::isLight).toList());
    List<Resonance> found = new ArrayList<>();
    List<Complex> starts = from.stream().filter(this::isFollowed).toList();
    List<RootPath> paths = RootPath.follow(starts, factor -> roots(kind, factor));
    for (int i = 0; i < starts.size(); i++) {
      RootPath path = paths.get(i);
      Optional<Complex> end = path.at().flatMap(s -> nearest(s, ends));
      end.ifPresent(ends::remove);
      found.add(new Resonance(kind, Optional.of(starts.get(i)), end, path.told()));
    }
    ends.forEach(s -> found.add(new Resonance(kind, Optional.empty(), Optional.of(s), true)));
    return found;
  }

  private boolean isFollowed(Complex s) {
    return Resonance.isLight(s) && range.slowest() < s.abs() && s.abs() < range.fastest();
  }

  /** The same root from another computation, with what the port does not see left out. */
  private static Optional<Complex> nearest(Complex s, List<Complex> ends) {
    return ends.stream()
        .filter(end -> NaturalFrequencies.distance(end, s) < RootPath.SAME)
        .findFirst();
  }

  /** All poles or zeros of the upper half plane, seen at the port or not, on the way. */
  private List<Complex> roots(Resonance.Kind kind, double factor) {
    List<Load> all = new ArrayList<>();
    List<Load> on = new ArrayList<>();
    for (Load load : network.loads()) {
      boolean before = against.contains(load);
      boolean after = loads.contains(load);
      double part = before == after ? 1 : after ? factor : 1 - factor;
      Load scaled = part > 0 && part < 1 ? LoadFactor.apply(load, part) : load;
      all.add(scaled);
      if ((before || after) && part > 0) {
        on.add(scaled);
      }
    }
    Circuit open = CircuitBuilder.build(withLoads(all), port, on, List.of());
    Circuit circuit = kind == Resonance.Kind.POLE ? open : open.withPortShort();
    return NaturalFrequencies.of(circuit, range).stream()
        .filter(s -> s.getImaginary() > 0)
        .toList();
  }

  private Network withLoads(List<Load> all) {
    return new Network(
        network.title(),
        network.nodes(),
        network.parts(),
        network.supplies(),
        network.ports(),
        all,
        network.cases(),
        network.limits(),
        network.sweep());
  }
}
