package loadmark.judge;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SortedSet;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import loadmark.network.Band;
import loadmark.response.Comparison;
import loadmark.response.Loading;

/**
 * Samples of one port over a band, close enough to follow it: 200 points a decade and more where a
 * point lies off the curve through its neighbours.
 */
final class Grid {
  private static final double PER_DECADE = 200;
  private static final double LEAST_INTERVALS = 100;
  private static final int MOST_POINTS = 20_000;

  /** In ln f: nothing narrower is followed. */
  private static final double LEAST_STEP = 1e-7;

  private Grid() {}

  /**
   * Samples a band.
   *
   * @param marks frequencies that must be among the points, the band's ends included; ascending
   * @return ascending; never more than {@value #MOST_POINTS} beside the first pass
   */
  static List<Loading> sample(Comparison comparison, SortedSet<Double> marks, Curves curves) {
    List<GridPoint> grid = points(comparison, curves, basePoints(marks));
    while (grid.size() < MOST_POINTS) {
      double[] more = between(grid, curves.offCurve(grid));
      if (more.length == 0) {
        break;
      }
      grid.addAll(points(comparison, curves, more));
      grid.sort(Comparator.comparingDouble(GridPoint::hz));
    }
    return grid.stream().map(GridPoint::loading).toList();
  }

  private static double[] basePoints(SortedSet<Double> marks) {
    DoubleStream.Builder base = DoubleStream.builder();
    double low = marks.first();
    base.add(low);
    for (double high : marks.tailSet(Math.nextUp(low))) {
      double decades = Math.log10(high / low);
      int n = (int) Math.max(LEAST_INTERVALS, Math.ceil(PER_DECADE * decades));
      for (int i = 1; i < n; i++) {
        base.add(Extremum.clamp(low * Math.pow(high / low, (double) i / n), low, high));
      }
      base.add(high);
      low = high;
    }
    return base.build().distinct().toArray();
  }

  private static List<GridPoint> points(Comparison comparison, Curves curves, double[] hz) {
    List<GridPoint> grid = new ArrayList<>(hz.length);
    for (Loading loading : comparison.at(hz)) {
      grid.add(new GridPoint(loading, curves.values(loading)));
    }
    return grid;
  }

  /** The middles of the intervals on both sides of each point off its curve, widest first. */
  private static double[] between(List<GridPoint> grid, boolean[] off) {
    return IntStream.range(0, grid.size() - 1)
        .filter(i -> (off[i] || off[i + 1]) && width(grid, i) > LEAST_STEP)
        .boxed()
        .sorted(Comparator.comparingDouble((Integer i) -> -width(grid, i)))
        .limit(MOST_POINTS - grid.size())
        .mapToDouble(i -> Math.sqrt(grid.get(i).hz()) * Math.sqrt(grid.get(i + 1).hz()))
        .toArray();
  }

  private static double width(List<GridPoint> grid, int i) {
    return grid.get(i + 1).x() - grid.get(i).x();
  }

  /** The points of a grid inside a band. */
  static List<Loading> inside(List<Loading> grid, Band band) {
    return grid.stream().filter(l -> band.fromHz() <= l.hz() && l.hz() <= band.toHz()).toList();
  }
}
