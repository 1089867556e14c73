package loadmark.equation;

import java.util.ArrayList;
import java.util.List;
import loadmark.network.Load;

/**
 * Two nodes where loads go: all shunt loads across them, or all series loads between them.
 *
 * @param loads those that go here, in the network's order
 * @param laws the law of each
 */
record Place(int first, int second, boolean series, List<Load> loads, List<Law> laws) {

  /** What stands here with these loads on: open, or a join, with none. */
  Law with(List<Load> on) {
    return with(on, List.of());
  }

  /** What those of the loads make up that are on but not among others. */
  Law with(List<Load> on, List<Load> others) {
    List<Law> present = new ArrayList<>(laws.size());
    for (int i = 0; i < laws.size(); i++) {
      if (isIn(on, loads.get(i)) && !isIn(others, loads.get(i))) {
        present.add(laws.get(i));
      }
    }
    return series ? Law.series(present) : Law.parallel(present);
  }

  /** Whether a load is among others; loads of one network go by their names. */
  static boolean isIn(List<Load> others, Load load) {
    for (Load other : others) {
      if (other.name().equals(load.name())) {
        return true;
      }
    }
    return false;
  }

  boolean isAt(int a, int b, boolean inSeries) {
    return series == inSeries && ((first == a && second == b) || (first == b && second == a));
  }
}
