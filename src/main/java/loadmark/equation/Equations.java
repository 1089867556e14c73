package loadmark.equation;

import java.util.ArrayList;
import java.util.List;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;

/**
 * The branches of one port's network, every other port closed and every link joined, and the places
 * where loads go. Compiled once for DC, where inductors are joins and capacitors open, and once for
 * all other frequencies. Immutable.
 */
public final class Equations {
  private final int nodes;
  private final int plus;
  private final int minus;
  private final List<Branch> branches;
  private final List<Place> places;
  private final double[] values;

  private Equations(
      int nodes, int plus, int minus, List<Branch> branches, List<Place> places, double[] values) {
    this.nodes = nodes;
    this.plus = plus;
    this.minus = minus;
    this.branches = branches;
    this.places = places;
    this.values = values;
  }

  public static Equations of(Network network, Port judged, boolean dc) {
    ElementReader reader = new ElementReader(dc);
    Joins joins = new Joins(network.nodes().size());
    List<Branch> all = new ArrayList<>();
    for (Part part : network.parts()) {
      all.add(branch(part.first(), part.second(), reader.read(part.value())));
    }
    Node ground = network.nodes().get(0);
    for (Supply supply : network.supplies()) {
      Law law = supply.behind().isEmpty() ? Law.Fixed.JOINED : reader.read(supply.behind().get());
      all.add(branch(supply.node(), ground, law));
    }
    for (Port port : network.ports()) {
      Law law = closure(port.closure(), reader);
      if (!port.name().equals(judged.name())) {
        all.add(branch(port.plus(), port.minus(), law));
      }
    }
    for (Branch branch : all) {
      if (branch.law() == Law.Fixed.JOINED) {
        joins.join(branch.first(), branch.second());
      }
    }
    List<Branch> branches = new ArrayList<>(all.size());
    for (Branch branch : all) {
      if (branch.law() instanceof Law.Sum) {
        branches.add(new Branch(joins.of(branch.first()), joins.of(branch.second()), branch.law()));
      }
    }
    List<Place> places = places(network, reader, joins);
    return new Equations(
        network.nodes().size(),
        joins.of(judged.plus().index()),
        joins.of(judged.minus().index()),
        branches,
        places,
        reader.values());
  }

  private static Branch branch(Node first, Node second, Law law) {
    return new Branch(first.index(), second.index(), law);
  }

  private static Law closure(Port.Closure closure, ElementReader reader) {
    if (closure instanceof Port.Closure.Open) {
      return Law.Fixed.OPEN;
    }
    if (closure instanceof Port.Closure.Shorted) {
      return Law.Fixed.JOINED;
    }
    OnePort across =
        closure instanceof Port.Closure.Terminated terminated
            ? terminated.value()
            : ((Port.Closure.Driven) closure).behind();
    return reader.read(across);
  }

  private static List<Place> places(Network network, ElementReader reader, Joins joins) {
    List<Place> places = new ArrayList<>();
    for (Load load : network.loads()) {
      int first = joins.of(load.first().index());
      int second = joins.of(load.second().index());
      Place place = place(places, first, second, load.placement() == Load.Placement.SERIES);
      place.loads().add(load);
      place.laws().add(reader.read(load.value()));
    }
    return places;
  }

  private static Place place(List<Place> places, int first, int second, boolean series) {
    for (Place place : places) {
      if (place.isAt(first, second, series)) {
        return place;
      }
    }
    Place place = new Place(first, second, series, new ArrayList<>(), new ArrayList<>());
    places.add(place);
    return place;
  }

  /**
   * The equations of a case beside those of its reference.
   *
   * @param without the loads that are on in the reference
   * @param with those that are on in the case
   */
  public ComparedNetwork compare(List<Load> without, List<Load> with) {
    Joins joins = new Joins(nodes);
    List<Branch> all = new ArrayList<>(branches);
    List<ChangedPlace> changed = new ArrayList<>();
    for (Place place : places) {
      if (isSame(place, without, with)) {
        Law law = place.with(with);
        if (law == Law.Fixed.JOINED) {
          joins.join(place.first(), place.second());
        } else if (law instanceof Law.Sum) {
          all.add(new Branch(place.first(), place.second(), law));
        }
      } else {
        changed.add(
            new ChangedPlace(
                place.first(),
                place.second(),
                place.series(),
                place.with(without),
                place.with(with),
                place.with(without, with),
                place.with(with, without)));
      }
    }
    return ComparedNetwork.of(nodes, plus, minus, all, changed, joins);
  }

  private static boolean isSame(Place place, List<Load> without, List<Load> with) {
    for (Load load : place.loads()) {
      if (Place.isIn(without, load) != Place.isIn(with, load)) {
        return false;
      }
    }
    return true;
  }

  /**
   * The nominal values of all elements, SI units: over the parts, then the supplies, then the
   * ports' closures, then the loads, each in the network's order. The same at DC and elsewhere. A 0
   * Ω resistor is joined once for all; other values may be replaced by positive ones.
   */
  public double[] nominalValues() {
    return values.clone();
  }
}
