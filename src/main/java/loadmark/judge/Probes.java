package loadmark.judge;

import java.util.List;

/**
 * Where to look beside the grid, such that between two neighbours of grid and probes together the
 * excess changes its sign at most once. The bands are then found by comparing neighbours, however
 * the probes were found: from turning points of the sampled excess, or from the midpoints between
 * crossings that are known algebraically.
 */
interface Probes {

  /**
   * Looks over one band.
   *
   * @param grid samples over one band, ascending, both ends in
   * @return further samples inside that band, in any order
   */
  List<Sample> find(Gauge gauge, List<Sample> grid);

  /** What the bands so found may be called. */
  LimitJudgement.Method method();
}
