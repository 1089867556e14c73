package loadmark.binding;

import java.util.List;
import loadmark.diagnostic.Findings;

/** One question about how a network hangs together, asked before any number is computed. */
interface Check {
  void check(Draft draft, Findings findings);

  /** Every check, in the order asked. */
  List<Check> ALL =
      List.of(
          new SeriesPlaceCheck(),
          new PortNodesCheck(),
          new ReachCheck(),
          new SingleConnectionCheck());
}
