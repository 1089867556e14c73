package loadmark.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loadmark.equation.ChangedPlace;
import loadmark.equation.ComparedNetwork;
import loadmark.equation.Law;

/**
 * How the nodes that the main elimination leaves are reduced, for one changed place, to those of
 * the port and of that place, while the other places are as they are then: the earlier ones changed
 * already. Its nodes are the main elimination's terminals by their index. Worked out once;
 * immutable.
 */
final class PlaceReduction {

  /**
   * What goes into a branch of the reduction.
   *
   * @param from a branch that the main elimination leaves, or the index of another place
   * @param isPlace which of both
   */
  record Input(int from, boolean isPlace) {}

  private final int place;
  private final int[] node;
  private final int first;
  private final int second;
  private final List<List<Input>> inputs = new ArrayList<>();
  private final Elimination elimination;

  /**
   * Works out one reduction.
   *
   * @param main the main elimination
   * @param terminals the nodes that it keeps, those of the port first
   */
  PlaceReduction(ComparedNetwork network, int place, Elimination main, int[] terminals) {
    this.place = place;
    int size = terminals.length;
    node = new int[size];
    for (int i = 0; i < size; i++) {
      node[i] = i;
    }
    List<ChangedPlace> places = network.places();
    for (int i = 0; i < places.size(); i++) {
      if (i != place && network.between(place, i) == Law.Fixed.JOINED) {
        join(index(terminals, places.get(i).first()), index(terminals, places.get(i).second()));
      }
    }
    Graph graph = new Graph(size);
    for (int i = 0; i < size; i++) {
      for (int j = i + 1; j < size; j++) {
        int from = main.left(terminals[i], terminals[j]);
        if (from >= 0) {
          graph.add(i, j, from, false);
        }
      }
    }
    for (int i = 0; i < places.size(); i++) {
      if (i != place && network.between(place, i) instanceof Law.Sum) {
        ChangedPlace other = places.get(i);
        graph.add(index(terminals, other.first()), index(terminals, other.second()), i, true);
      }
    }
    first = node[index(terminals, places.get(place).first())];
    second = node[index(terminals, places.get(place).second())];
    boolean[] kept = new boolean[size];
    for (int i = 0; i < size; i++) {
      kept[i] = node[i] != i || i == node[0] || i == node[1] || i == first || i == second;
    }
    elimination = graph.eliminate(kept, main);
  }

  private void join(int a, int b) {
    int from = node[a];
    int to = node[b];
    for (int i = 0; i < node.length; i++) {
      node[i] = node[i] == from ? to : node[i];
    }
  }

  static int index(int[] terminals, int of) {
    int i = 0;
    while (terminals[i] != of) {
      i++;
    }
    return i;
  }

  int place() {
    return place;
  }

  /** The node that a terminal is here. */
  int node(int terminal) {
    return node[terminal];
  }

  int plus() {
    return node[ComparedNetwork.PLUS];
  }

  int minus() {
    return node[ComparedNetwork.MINUS];
  }

  /** The place's first node. */
  int first() {
    return first;
  }

  int second() {
    return second;
  }

  /** Whether the place's nodes are those of the port. */
  boolean isAcrossPort() {
    return Math.min(first, second) == Math.min(plus(), minus())
        && Math.max(first, second) == Math.max(plus(), minus());
  }

  /** What is to be added up in a given branch. */
  List<Input> inputs(int branch) {
    return inputs.get(branch);
  }

  Elimination elimination() {
    return elimination;
  }

  /** The branches of the reduction as they are found. */
  private final class Graph {
    private final int[][] number;
    private final int[] from;
    private final int[] to;
    private int size;

    Graph(int nodes) {
      number = new int[nodes][nodes];
      from = new int[nodes * nodes];
      to = new int[nodes * nodes];
    }

    void add(int a, int b, int source, boolean isPlace) {
      int i = Math.min(node[a], node[b]);
      int j = Math.max(node[a], node[b]);
      if (i == j) {
        return;
      }
      if (number[i][j] == 0) {
        from[size] = i;
        to[size] = j;
        number[i][j] = ++size;
        inputs.add(new ArrayList<>(1));
      }
      inputs.get(number[i][j] - 1).add(new Input(source, isPlace));
    }

    Elimination eliminate(boolean[] kept, Elimination main) {
      int[] made = new int[size];
      for (int i = 0; i < size; i++) {
        for (Input input : inputs.get(i)) {
          made[i] += 1 + (input.isPlace() ? 0 : main.additions(input.from()));
        }
      }
      return new Elimination(Arrays.copyOf(from, size), Arrays.copyOf(to, size), made, kept);
    }
  }
}
