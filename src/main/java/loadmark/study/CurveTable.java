package loadmark.study;

import java.util.List;
import java.util.Optional;
import loadmark.network.Case;
import loadmark.network.Network;
import loadmark.network.Port;
import loadmark.response.Loading;
import loadmark.response.PortRoots;

/**
 * The impedances of a network.
 *
 * @param curves port by port, each port's case {@code bare} first
 */
public record CurveTable(Network network, List<Curve> curves) {
  public CurveTable {
    curves = List.copyOf(curves);
  }

  /**
   * One port in one case.
   *
   * @param points in rising frequency, or in the order asked for
   * @param roots poles and zeros, where they are asked for and could be found
   */
  public record Curve(Port port, Case shown, List<Loading> points, Optional<PortRoots> roots) {
    public Curve(Port port, Case shown, List<Loading> points) {
      this(port, shown, points, Optional.empty());
    }

    public Curve {
      points = List.copyOf(points);
    }
  }

  /** How many impedances could not be determined. */
  public long countUndetermined() {
    return curves.stream()
        .flatMap(c -> c.points().stream())
        .filter(p -> p.with().isUndetermined())
        .count();
  }
}
