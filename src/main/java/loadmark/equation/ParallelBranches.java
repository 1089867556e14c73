package loadmark.equation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/** Gathers branches, those between the same two nodes into one. */
final class ParallelBranches {
  private static final Comparator<Branch> ORDER =
      new Comparator<>() {
        @Override
        public int compare(Branch a, Branch b) {
          int order = Integer.compare(a.first(), b.first());
          return order != 0 ? order : Integer.compare(a.second(), b.second());
        }
      };

  private final List<Branch> all = new ArrayList<>();

  void add(int a, int b, Law law) {
    all.add(new Branch(Math.min(a, b), Math.max(a, b), law));
  }

  /** One branch for each pair of nodes, in the order of the nodes. */
  List<Branch> toList() {
    Branch[] sorted = all.toArray(new Branch[0]);
    Arrays.sort(sorted, ORDER);
    List<Branch> merged = new ArrayList<>(sorted.length);
    List<Law> laws = new ArrayList<>();
    for (int i = 0; i < sorted.length; i++) {
      laws.add(sorted[i].law());
      if (i + 1 == sorted.length || ORDER.compare(sorted[i], sorted[i + 1]) != 0) {
        merged.add(new Branch(sorted[i].first(), sorted[i].second(), Law.parallel(laws)));
        laws.clear();
      }
    }
    return merged;
  }
}
