package loadmark.allowance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;

/** How heavy the loads of a network may be. */
public final class Allowances {
  private final Network network;

  public Allowances(Network network) {
    this.network = network;
  }

  /** A port, a case and one of its loads. */
  private record Place(Port port, Case within, Load load) {}

  /**
   * Every load in every case that it is on in, and not in its reference too, at every port.
   *
   * @param hz the frequencies to tell single allowances at, rising
   */
  public List<LoadAllowance> all(List<Port> ports, List<Case> cases, double[] hz) {
    List<Place> places = new ArrayList<>();
    for (Port port : ports) {
      for (Case one : cases) {
        for (Load load : added(one)) {
          places.add(new Place(port, one, load));
        }
      }
    }
    return places.parallelStream().map(place -> allowance(place, hz)).toList();
  }

  /** The loads of a case that its reference does not have. */
  private static List<Load> added(Case one) {
    return one.loads().stream().filter(load -> !one.against().contains(load)).toList();
  }

  private LoadAllowance allowance(Place place, double[] hz) {
    LoadPlace seen = LoadPlace.of(network, place.port(), place.within(), place.load());
    List<Limit> limits = limits(place.within(), place.port());
    boolean series = place.load().placement() == Load.Placement.SERIES;
    List<PointAllowance> points =
        seen.at(hz).stream()
            .map(p -> ChangeDisc.at(p, inScope(limits, p.without().hz()), series))
            .toList();
    return new LoadAllowance(
        place.port(), place.within(), place.load(), points, heaviest(place, seen, limits, true));
  }

  private List<Limit> limits(Case one, Port port) {
    return network.limits().stream().filter(l -> l.holdsFor(one, port)).toList();
  }

  private static List<Limit> inScope(List<Limit> limits, double hz) {
    return limits.stream()
        .filter(l -> l.scope().stream().anyMatch(b -> b.fromHz() <= hz && hz <= b.toHz()))
        .toList();
  }

  /**
   * What would have been fine in place of the only load that a case adds; empty where it adds
   * several or none.
   */
  public Optional<Heaviest> findFine(Case one, Port port) {
    List<Load> added = added(one);
    if (added.size() != 1) {
      return Optional.empty();
    }
    LoadPlace seen = LoadPlace.of(network, port, one, added.get(0));
    return Optional.of(
        heaviest(new Place(port, one, added.get(0)), seen, limits(one, port), false));
  }

  private Heaviest heaviest(Place place, LoadPlace seen, List<Limit> limits, boolean careful) {
    Load load = place.load();
    boolean series = load.placement() == Load.Placement.SERIES;
    Trial trial = new Trial(network, place.port(), place.within(), load, limits);
    GrowthSearch search = new GrowthSearch(trial, new StopFinder(seen, limits), limits, careful);
    Growth multiple = new Growth.Multiple(load.value(), series);
    Stop stop = search.find(multiple);
    double omega = 2 * Math.PI * middleHz(limits);
    Optional<Heaviest.Beside> beside =
        ParallelRc.find(load.value())
            .map(
                own ->
                    new Heaviest.Beside(
                        amount(search, Growth.resistance(own, series, omega)),
                        amount(search, Growth.capacitance(own, series, omega))));
    return new Heaviest(amount(multiple, stop), beside, stop.limit());
  }

  private static Amount amount(GrowthSearch search, Growth growth) {
    return amount(growth, search.find(growth));
  }

  private static Amount amount(Growth growth, Stop stop) {
    if (stop.t() == 0) {
      return Amount.NONE;
    }
    return stop.limit().isEmpty() ? Amount.ANY : Amount.of(growth.told(stop.t()));
  }

  /** Of all scopes, by logarithm; 1 Hz where there is but DC. */
  private static double middleHz(List<Limit> limits) {
    return Math.exp(
        limits.stream()
            .flatMap(l -> l.scope().stream())
            .filter(b -> b.fromHz() > 0)
            .mapToDouble(b -> (Math.log(b.fromHz()) + Math.log(b.toHz())) / 2)
            .average()
            .orElse(0));
  }
}
