package loadmark.equation;

import java.util.ArrayList;
import java.util.List;

/**
 * A port's network with and without a case's loads, as a graph: what both have in common, and the
 * places where they differ. Only what can carry current between the port's nodes is kept. Node 0 is
 * the port's plus, node 1 its minus. Immutable.
 *
 * @param nodes how many there are
 * @param branches in common, at most one between two nodes, none around one node
 * @param without what the topology alone says of the reference
 * @param with what it says of the case
 */
public record ComparedNetwork(
    int nodes,
    List<Branch> branches,
    List<ChangedPlace> places,
    List<Constraint> constraints,
    Topology without,
    Topology with) {
  public static final int PLUS = 0;
  public static final int MINUS = 1;

  /** What connects the port's nodes. */
  public enum Topology {
    /** Joins alone: the impedance is 0. */
    JOINED,
    /** Nothing. */
    OPEN,
    /** Branches. */
    CONNECTED
  }

  public ComparedNetwork {
    branches = List.copyOf(branches);
    places = List.copyOf(places);
    constraints = List.copyOf(constraints);
  }

  static ComparedNetwork of(
      int nodes,
      int plus,
      int minus,
      List<Branch> branches,
      List<ChangedPlace> places,
      Joins joins) {
    Relevance relevance = new Relevance(nodes, joins.of(plus), joins.of(minus));
    for (Branch branch : branches) {
      relevance.add(joins.of(branch.first()), joins.of(branch.second()));
    }
    for (ChangedPlace place : places) {
      relevance.add(joins.of(place.first()), joins.of(place.second()));
    }
    boolean[] relevant = relevance.find();
    Numbering numbering = new Numbering(nodes, joins, plus, minus);
    ParallelBranches kept = new ParallelBranches();
    for (int i = 0; i < branches.size(); i++) {
      if (relevant[i]) {
        Branch branch = branches.get(i);
        kept.add(numbering.of(branch.first()), numbering.of(branch.second()), branch.law());
      }
    }
    List<ChangedPlace> changed = new ArrayList<>(places.size());
    for (int i = 0; i < places.size(); i++) {
      ChangedPlace place = places.get(i);
      if (relevant[branches.size() + i]) {
        int first = numbering.of(place.first());
        int second = numbering.of(place.second());
        changed.add(place.between(first, second));
      }
    }
    List<Branch> merged = kept.toList();
    boolean shorted = joins.areOne(plus, minus);
    return new ComparedNetwork(
        numbering.size(),
        merged,
        changed,
        List.of(),
        shorted ? Topology.JOINED : topology(numbering.size(), merged, changed, false),
        shorted ? Topology.JOINED : topology(numbering.size(), merged, changed, true));
  }

  /**
   * Whether changing one place can change anything while the places before it are as in the case
   * and those after it as in the reference.
   */
  public boolean isEffective(int place) {
    Joins joins = new Joins(nodes);
    for (int i = 0; i < places.size(); i++) {
      if (i != place && between(place, i) == Law.Fixed.JOINED) {
        joins.join(places.get(i).first(), places.get(i).second());
      }
    }
    Relevance relevance = new Relevance(nodes, joins.of(PLUS), joins.of(MINUS));
    ChangedPlace own = places.get(place);
    relevance.add(joins.of(own.first()), joins.of(own.second()));
    for (Branch branch : branches) {
      relevance.add(joins.of(branch.first()), joins.of(branch.second()));
    }
    for (int i = 0; i < places.size(); i++) {
      if (i != place && between(place, i) instanceof Law.Sum) {
        relevance.add(joins.of(places.get(i).first()), joins.of(places.get(i).second()));
      }
    }
    return relevance.find()[0];
  }

  /** Whether any place's change can change anything. */
  public boolean isChanged() {
    for (int i = 0; i < places.size(); i++) {
      if (isEffective(i)) {
        return true;
      }
    }
    return false;
  }

  /** The law at another place while one is being changed: the earlier ones have changed already. */
  public Law between(int changing, int place) {
    return place < changing ? places.get(place).with() : places.get(place).without();
  }

  private static Topology topology(
      int nodes, List<Branch> branches, List<ChangedPlace> places, boolean with) {
    Joins joined = new Joins(nodes);
    Joins connected = new Joins(nodes);
    for (Branch branch : branches) {
      connected.join(branch.first(), branch.second());
    }
    for (ChangedPlace place : places) {
      Law law = with ? place.with() : place.without();
      if (law != Law.Fixed.OPEN) {
        connected.join(place.first(), place.second());
      }
      if (law == Law.Fixed.JOINED) {
        joined.join(place.first(), place.second());
      }
    }
    if (joined.areOne(PLUS, MINUS)) {
      return Topology.JOINED;
    }
    return connected.areOne(PLUS, MINUS) ? Topology.CONNECTED : Topology.OPEN;
  }

  /** New numbers for the nodes that are kept, in the order they are met after the port's two. */
  private static final class Numbering {
    private final Joins joins;
    private final int[] number;
    private int size;

    Numbering(int nodes, Joins joins, int plus, int minus) {
      this.joins = joins;
      number = new int[nodes];
      of(plus);
      of(minus);
      size = 2;
    }

    int of(int node) {
      int root = joins.of(node);
      if (number[root] == 0) {
        number[root] = ++size;
      }
      return number[root] - 1;
    }

    int size() {
      return size;
    }
  }
}
