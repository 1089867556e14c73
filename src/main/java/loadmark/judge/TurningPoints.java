package loadmark.judge;

import java.util.ArrayList;
import java.util.List;

/**
 * Probes at the turning points of a sampled excess: a hump between two points that are kept, or a
 * gap between two that are broken, is looked into where it could reach the bound.
 */
final class TurningPoints implements Probes {
  /** How much farther than its neighbours differ a turning point may lie: a parabola needs 1/8. */
  private static final double REACH = 4;

  /** An excess that turns this near to zero touches it. */
  private static final double TOUCH = 1e-12;

  @Override
  public List<Sample> find(Gauge gauge, List<Sample> grid) {
    List<Sample> found = new ArrayList<>();
    for (int i = 0; i < grid.size(); i++) {
      Sample low = grid.get(Math.max(i - 1, 0));
      Sample here = grid.get(i);
      Sample high = grid.get(Math.min(i + 1, grid.size() - 1));
      double spread =
          Math.max(Math.abs(low.level() - here.level()), Math.abs(high.level() - here.level()));
      if (!here.isKnown() || Math.abs(here.level()) > REACH * spread || spread < TOUCH) {
        continue;
      }
      if (!here.isPast() && here.level() >= low.level() && here.level() >= high.level()) {
        Sample peak = Extremum.highest(gauge, low.hz(), here, high.hz());
        if (peak.isBroken()) {
          found.add(peak);
        }
      } else if (here.isPast() && here.level() <= low.level() && here.level() <= high.level()) {
        Sample gap = Extremum.lowest(gauge, low.hz(), here, high.hz());
        if (gap.excess() < -TOUCH && gap.isKnown()) {
          found.add(gap);
        }
      }
    }
    return found;
  }

  @Override
  public LimitJudgement.Method method() {
    return LimitJudgement.Method.SAMPLED;
  }
}
