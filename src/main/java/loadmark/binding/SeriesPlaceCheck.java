package loadmark.binding;

import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;
import loadmark.network.Load;
import loadmark.network.Load.Placement;
import loadmark.network.Node;
import loadmark.network.Part;
import loadmark.network.Supply;

/** Nothing but series loads may stand across a series load's place: absent, it is a join. */
final class SeriesPlaceCheck implements Check {
  @Override
  public void check(Draft draft, Findings findings) {
    for (Load load : draft.loads()) {
      if (load.placement() != Placement.SERIES) {
        continue;
      }
      for (Part part : draft.parts()) {
        if (isAcross(load, part.first(), part.second())) {
          report(findings, draft.placeOf(part), "the part `" + part.name() + "`", load);
        }
      }
      for (Load other : draft.loads()) {
        if (other.placement() == Placement.SHUNT && isAcross(load, other.first(), other.second())) {
          report(
              findings,
              draft.lineOf(other).nodes().span(),
              "the shunt load `" + other.name() + "`",
              load);
        }
      }
      for (Supply supply : draft.supplies()) {
        if (isAcross(load, supply.node(), draft.nodes().ground())) {
          report(
              findings,
              draft.lineOf(load).nodes().span(),
              "the supply of `" + supply.node().name() + "`",
              load);
        }
      }
    }
  }

  private static boolean isAcross(Load load, Node a, Node b) {
    return (load.first().equals(a) && load.second().equals(b))
        || (load.first().equals(b) && load.second().equals(a));
  }

  private static void report(Findings findings, Span place, String what, Load load) {
    findings.error(
        "across-series-load",
        place,
        what + " stands across the place of the series load `" + load.name() + "`",
        "absent, a series load joins its two nodes; give it a node of its own");
  }
}
