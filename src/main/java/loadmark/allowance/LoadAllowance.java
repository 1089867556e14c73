package loadmark.allowance;

import java.util.List;
import loadmark.network.Case;
import loadmark.network.Load;
import loadmark.network.Port;

/**
 * What one load's place can take, with the other loads of a case on, seen at one port.
 *
 * @param points frequency by frequency, for limits on the change; in rising frequency
 * @param heaviest for all limits over all frequencies
 */
public record LoadAllowance(
    Port port, Case within, Load load, List<PointAllowance> points, Heaviest heaviest) {
  public LoadAllowance {
    points = List.copyOf(points);
  }
}
