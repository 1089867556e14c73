package loadmark.response;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.Part;
import org.apfloat.Apcomplex;
import org.apfloat.ApcomplexMath;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/**
 * A network's port impedance in arbitrary precision, by dense Gaussian elimination of the nodal
 * matrix with partial pivoting: another method than that under test, with digits to spare. For
 * networks of parts and loads alone, the first port being judged.
 */
final class ExactNetwork {
  /** Decimal digits; the values of the tests differ by up to 30 orders of magnitude. */
  private static final long DIGITS = 110;

  private static final Apfloat TWO_PI = ApfloatMath.pi(DIGITS).multiply(new Apfloat(2, DIGITS));
  private static final Apcomplex ZERO = Apcomplex.ZERO;
  private static final Apcomplex ONE = new Apcomplex(new Apfloat(1, DIGITS));

  /** An element's share in a branch: its own |x·∂y/∂x| and the branch's nodes. */
  private record Share(OnePort element, int a, int b, Apcomplex slope) {}

  private record Slope(OnePort element, Apcomplex slope) {}

  private final Network network;
  private final Apcomplex s;
  private final int[] merged;
  private final List<Share> shares = new ArrayList<>();
  private final Apcomplex[][] matrix;
  private Apcomplex[] volts = new Apcomplex[0];

  ExactNetwork(Network network, List<Load> on, double hz) {
    this.network = network;
    s = new Apcomplex(ZERO.real(), TWO_PI.multiply(exact(hz)));
    merged = new int[network.nodes().size()];
    for (int i = 0; i < merged.length; i++) {
      merged[i] = i;
    }
    Map<Set<Node>, List<OnePort>> places = new LinkedHashMap<>();
    for (Load load : network.loads()) {
      if (load.placement() == Load.Placement.SERIES) {
        List<OnePort> there =
            places.computeIfAbsent(Set.of(load.first(), load.second()), k -> new ArrayList<>());
        if (on.contains(load)) {
          there.add(load.value());
        }
      }
    }
    places.forEach(
        (nodes, there) -> {
          if (there.isEmpty()) {
            Node[] pair = nodes.toArray(new Node[0]);
            join(pair[0].index(), pair[1].index());
          }
        });
    matrix = new Apcomplex[merged.length][merged.length];
    for (Apcomplex[] row : matrix) {
      Arrays.fill(row, ZERO);
    }
    for (Part part : network.parts()) {
      add(part.first(), part.second(), part.value());
    }
    for (Load load : network.loads()) {
      if (load.placement() == Load.Placement.SHUNT && on.contains(load)) {
        add(load.first(), load.second(), load.value());
      }
    }
    places.forEach(
        (nodes, there) -> {
          if (!there.isEmpty()) {
            Node[] pair = nodes.toArray(new Node[0]);
            add(pair[0], pair[1], OnePort.series(there));
          }
        });
  }

  static Apfloat exact(double value) {
    return new Apfloat(new BigDecimal(value), DIGITS);
  }

  private void join(int a, int b) {
    int from = merged[a];
    int to = merged[b];
    for (int i = 0; i < merged.length; i++) {
      merged[i] = merged[i] == Math.max(from, to) ? Math.min(from, to) : merged[i];
    }
  }

  private void add(Node first, Node second, OnePort value) {
    int a = merged[first.index()];
    int b = merged[second.index()];
    if (a == b) {
      return;
    }
    List<Slope> slopes = new ArrayList<>();
    Apcomplex y = ONE.divide(impedance(value, ONE, slopes));
    Apcomplex square = y.multiply(y).negate();
    for (Slope slope : slopes) {
      shares.add(new Share(slope.element, a, b, square.multiply(slope.slope)));
    }
    matrix[a][a] = matrix[a][a].add(y);
    matrix[b][b] = matrix[b][b].add(y);
    matrix[a][b] = matrix[a][b].subtract(y);
    matrix[b][a] = matrix[b][a].subtract(y);
  }

  /** z; and x·∂z/∂x of each element, times {@code by}. */
  private Apcomplex impedance(OnePort value, Apcomplex by, List<Slope> slopes) {
    if (value instanceof OnePort.Element element) {
      Apfloat x = exact(element.value().nominal());
      Apcomplex z =
          switch (element.kind()) {
            case RESISTANCE -> x;
            case CONDUCTANCE -> ONE.divide(x);
            case INDUCTANCE -> s.multiply(x);
            case CAPACITANCE -> ONE.divide(s.multiply(x));
          };
      boolean falls =
          element.kind() == OnePort.ElementKind.CONDUCTANCE
              || element.kind() == OnePort.ElementKind.CAPACITANCE;
      slopes.add(new Slope(element, by.multiply(falls ? z.negate() : z)));
      return z;
    }
    if (value instanceof OnePort.Series series) {
      Apcomplex sum = ZERO;
      for (OnePort member : series.members()) {
        sum = sum.add(impedance(member, by, slopes));
      }
      return sum;
    }
    List<OnePort> members = ((OnePort.Parallel) value).members();
    Apcomplex sum = ZERO;
    for (OnePort member : members) {
      sum = sum.add(ONE.divide(impedance(member, ZERO, new ArrayList<>())));
    }
    Apcomplex z = ONE.divide(sum);
    for (OnePort member : members) {
      Apcomplex own = impedance(member, ZERO, new ArrayList<>());
      Apcomplex ratio = z.divide(own);
      impedance(member, by.multiply(ratio).multiply(ratio), slopes);
    }
    return z;
  }

  /** The impedance of the first port. */
  Apcomplex solve() {
    int plus = merged[network.ports().get(0).plus().index()];
    int minus = merged[network.ports().get(0).minus().index()];
    int size = merged.length;
    Apcomplex[] known = new Apcomplex[size];
    Arrays.fill(known, ZERO);
    known[plus] = ONE;
    boolean[] out = new boolean[size];
    for (int i = 0; i < size; i++) {
      out[i] = i == minus || merged[i] != i;
    }
    List<Integer> rows = new ArrayList<>();
    List<Integer> columns = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      if (!out[i]) {
        rows.add(i);
        columns.add(i);
      }
    }
    for (int k = 0; k < columns.size(); k++) {
      int column = columns.get(k);
      int best = k;
      for (int i = k + 1; i < rows.size(); i++) {
        if (norm(matrix[rows.get(i)][column]).compareTo(norm(matrix[rows.get(best)][column])) > 0) {
          best = i;
        }
      }
      Collections.swap(rows, k, best);
      int top = rows.get(k);
      for (int i = k + 1; i < rows.size(); i++) {
        int row = rows.get(i);
        if (matrix[row][column].equals(ZERO)) {
          continue;
        }
        Apcomplex factor = matrix[row][column].divide(matrix[top][column]);
        for (int j = k + 1; j < columns.size(); j++) {
          int other = columns.get(j);
          if (!matrix[top][other].equals(ZERO)) {
            matrix[row][other] = matrix[row][other].subtract(factor.multiply(matrix[top][other]));
          }
        }
        known[row] = known[row].subtract(factor.multiply(known[top]));
      }
    }
    volts = new Apcomplex[size];
    Arrays.fill(volts, ZERO);
    for (int k = columns.size() - 1; k >= 0; k--) {
      int top = rows.get(k);
      Apcomplex sum = known[top];
      for (int j = k + 1; j < columns.size(); j++) {
        int other = columns.get(j);
        if (!matrix[top][other].equals(ZERO)) {
          sum = sum.subtract(matrix[top][other].multiply(volts[other]));
        }
      }
      volts[columns.get(k)] = sum.divide(matrix[top][columns.get(k)]);
    }
    return volts[plus];
  }

  private static Apfloat norm(Apcomplex z) {
    return z.real().multiply(z.real()).add(z.imag().multiply(z.imag()));
  }

  /** κ = Σ |x·∂Z/∂x| / |Z| over all elements' values and the frequency, after {@link #solve}. */
  double condition(Apcomplex z) {
    double sum = 0;
    for (Share share : shares) {
      Apcomplex across = volts[share.a].subtract(volts[share.b]);
      sum += abs(share.slope.multiply(across).multiply(across).divide(z));
    }
    // s·∂Z/∂s is the sum of the same terms over inductors less that over capacitors: no more.
    return 2 * sum;
  }

  /**
   * Σ |x·∂H/∂x| / |H| of H = Z′/Z − 1 over all elements' values, this being the network of Z; after
   * {@link #solve} of both.
   */
  double conditionOfChange(ExactNetwork loaded, Apcomplex z, Apcomplex loadedZ) {
    Apcomplex ratio = loadedZ.divide(z);
    IdentityHashMap<OnePort, Apcomplex> slopes = new IdentityHashMap<>();
    gather(slopes, z, ratio);
    loaded.gather(slopes, loadedZ, ratio.negate());
    double sum = 0;
    for (Apcomplex slope : slopes.values()) {
      sum += abs(slope.divide(ratio.subtract(ONE)));
    }
    return 2 * sum;
  }

  private void gather(IdentityHashMap<OnePort, Apcomplex> slopes, Apcomplex z, Apcomplex by) {
    for (Share share : shares) {
      Apcomplex across = volts[share.a].subtract(volts[share.b]);
      Apcomplex slope = share.slope.multiply(across).multiply(across).divide(z).multiply(by);
      slopes.merge(share.element, slope, Apcomplex::add);
    }
  }

  /** |found − exact|/|exact|; absolute where that is 0. */
  static double error(Apcomplex exact, double re, double im) {
    Apcomplex error = new Apcomplex(exact(re), exact(im)).subtract(exact);
    return exact.equals(ZERO) ? abs(error) : abs(error.divide(exact));
  }

  static double abs(Apcomplex z) {
    return ApcomplexMath.abs(z).doubleValue();
  }
}
