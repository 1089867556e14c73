package loadmark.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loadmark.equation.Branch;
import loadmark.equation.ChangedPlace;
import loadmark.equation.ComparedNetwork;
import loadmark.equation.Law;

/**
 * What is worked out once for a case: the main elimination down to the nodes of the port and of the
 * changed places, and the reductions from there. Immutable.
 */
final class CasePlan {
  final ComparedNetwork network;
  final Elimination main;

  /** The nodes that the main elimination keeps, those of the port first. */
  final int[] terminals;

  /** One for each place whose change can matter. */
  final List<PlaceReduction> reductions;

  CasePlan(ComparedNetwork network) {
    this.network = network;
    boolean[] kept = new boolean[network.nodes()];
    kept[ComparedNetwork.PLUS] = true;
    kept[ComparedNetwork.MINUS] = true;
    for (ChangedPlace place : network.places()) {
      kept[place.first()] = true;
      kept[place.second()] = true;
    }
    int[] found = new int[kept.length];
    int size = 0;
    for (int i = 0; i < kept.length; i++) {
      if (kept[i]) {
        found[size++] = i;
      }
    }
    terminals = Arrays.copyOf(found, size);
    int[] first = new int[network.branches().size()];
    int[] second = new int[first.length];
    for (int i = 0; i < first.length; i++) {
      Branch branch = network.branches().get(i);
      first[i] = branch.first();
      second[i] = branch.second();
    }
    main = new Elimination(first, second, new int[first.length], kept);
    reductions = new ArrayList<>(network.places().size());
    for (int i = 0; i < network.places().size(); i++) {
      if (network.isEffective(i)) {
        reductions.add(new PlaceReduction(network, i, main, terminals));
      }
    }
  }

  /** Whether the port's nodes are joined somewhere on the way from the reference to the case. */
  boolean isInterrupted() {
    for (PlaceReduction reduction : reductions) {
      ChangedPlace place = network.places().get(reduction.place());
      boolean joined = place.without() == Law.Fixed.JOINED || place.with() == Law.Fixed.JOINED;
      if (reduction.plus() == reduction.minus() || (joined && reduction.isAcrossPort())) {
        return true;
      }
    }
    return false;
  }
}
