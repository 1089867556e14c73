package loadmark.judge;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import loadmark.network.Band;

/**
 * Probes at the turning points of a sampled excess: a hump between two points that are kept, or a
 * gap between two that are broken, is looked into where it could reach the bound.
 */
final class TurningPoints implements Probes {
  /** How much farther than its neighbours differ a turning point may lie: a parabola needs 1/8. */
  private static final double REACH = 4;

  /** An excess that turns this near to zero touches it. */
  private static final double TOUCH = 1e-12;

  private final String why;

  /**
   * @param why nothing better could be done, in words that follow "because"
   */
  TurningPoints(String why) {
    this.why = why;
  }

  @Override
  public Found find(Gauge gauge, List<Sample> grid) {
    return new Found(added(gauge, grid), Optional.of(why));
  }

  @Override
  public Optional<Sample> raise(Gauge gauge, Band band, Sample worst) {
    return Optional.empty();
  }

  /** The samples, and those at turning points between them. */
  static List<Sample> added(Gauge gauge, List<Sample> samples) {
    TreeMap<Double, Sample> all = new TreeMap<>();
    find(gauge, samples, all);
    samples.forEach(s -> all.put(s.hz(), s));
    return List.copyOf(all.values());
  }

  private static void find(Gauge gauge, List<Sample> samples, Map<Double, Sample> found) {
    for (int i = 0; i < samples.size(); i++) {
      Sample low = samples.get(Math.max(i - 1, 0));
      Sample here = samples.get(i);
      Sample high = samples.get(Math.min(i + 1, samples.size() - 1));
      double spread =
          Math.max(Math.abs(low.level() - here.level()), Math.abs(high.level() - here.level()));
      if (!here.isKnown() || Math.abs(here.level()) > REACH * spread || spread < TOUCH) {
        continue;
      }
      if (!here.isPast() && here.level() >= low.level() && here.level() >= high.level()) {
        Sample peak = Extremum.highest(gauge, low.hz(), here, high.hz());
        if (peak.isBroken()) {
          found.put(peak.hz(), peak);
        }
      } else if (here.isPast() && here.level() <= low.level() && here.level() <= high.level()) {
        Sample gap = Extremum.lowest(gauge, low.hz(), here, high.hz());
        if (gap.excess() < -TOUCH && gap.isKnown()) {
          found.put(gap.hz(), gap);
        }
      }
    }
  }
}
