package loadmark.response;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;
import org.ejml.data.ZMatrixRMaj;
import org.ejml.dense.row.CommonOps_ZDRM;
import org.ejml.dense.row.NormOps_ZDRM;

/** A comparison by a dense solution of the nodal equations at each frequency. */
record DenseComparison(Network network, Port port, List<Load> loads, List<Load> against)
    implements Comparison {
  private static final double LARGEST_RESIDUAL = 1e-10;

  private record Branch(int first, int second, Ohms z) {}

  DenseComparison {
    loads = List.copyOf(loads);
    against = List.copyOf(against);
  }

  @Override
  public List<Loading> at(double[] hz) {
    List<Loading> loadings = new ArrayList<>(hz.length);
    for (double f : hz) {
      loadings.add(at(f));
    }
    return loadings;
  }

  @Override
  public Loading at(double hz) {
    Ohms without = impedance(against, hz);
    Ohms with = loads.equals(against) ? without : impedance(loads, hz);
    return new Loading(
        hz,
        without,
        with,
        change(without, with),
        Double.POSITIVE_INFINITY,
        Double.POSITIVE_INFINITY,
        Double.POSITIVE_INFINITY);
  }

  private static Change change(Ohms without, Ohms with) {
    if (without.isUndetermined() || with.isUndetermined()) {
      return Change.UNDETERMINED;
    }
    if (without.isOpen()) {
      return with.isOpen() ? Change.UNDETERMINED : Change.of(-1, 0);
    }
    if (without.isZero()) {
      return with.isZero() ? Change.UNDETERMINED : Change.UNBOUNDED;
    }
    if (with.isOpen()) {
      return Change.UNBOUNDED;
    }
    double re = with.re() - without.re();
    double im = with.im() - without.im();
    double square = without.re() * without.re() + without.im() * without.im();
    double changeRe = (re * without.re() + im * without.im()) / square;
    double changeIm = (im * without.re() - re * without.im()) / square;
    return Double.isFinite(changeRe) && Double.isFinite(changeIm)
        ? Change.of(changeRe, changeIm)
        : Change.UNDETERMINED;
  }

  private Ohms impedance(List<Load> on, double hz) {
    int[] merged = new int[network.nodes().size()];
    for (int i = 0; i < merged.length; i++) {
      merged[i] = i;
    }
    List<Branch> branches = new ArrayList<>();
    for (Part part : network.parts()) {
      add(branches, part.first(), part.second(), part.value(), hz);
    }
    for (Supply supply : network.supplies()) {
      if (supply.behind().isEmpty()) {
        join(merged, supply.node().index(), 0);
      } else {
        add(branches, supply.node(), network.nodes().get(0), supply.behind().get(), hz);
      }
    }
    for (Port other : network.ports()) {
      if (other.equals(port) || other.closure() instanceof Port.Closure.Open) {
        continue;
      }
      if (other.closure() instanceof Port.Closure.Terminated terminated) {
        add(branches, other.plus(), other.minus(), terminated.value(), hz);
      } else if (other.closure() instanceof Port.Closure.Driven driven) {
        add(branches, other.plus(), other.minus(), driven.behind(), hz);
      } else {
        join(merged, other.plus().index(), other.minus().index());
      }
    }
    addLoads(branches, on, hz);
    boolean undetermined = false;
    for (Branch branch : branches) {
      undetermined |= branch.z.isUndetermined();
      if (branch.z.isZero()) {
        join(merged, branch.first, branch.second);
      }
    }
    return undetermined ? Ohms.UNDETERMINED : solve(branches, merged);
  }

  /** Shunt loads as branches; the series loads of one place as one branch, a join without any. */
  private void addLoads(List<Branch> branches, List<Load> on, double hz) {
    Map<Set<Node>, List<OnePort>> series = new LinkedHashMap<>();
    for (Load load : network.loads()) {
      if (load.placement() == Load.Placement.SHUNT) {
        if (on.contains(load)) {
          add(branches, load.first(), load.second(), load.value(), hz);
        }
        continue;
      }
      List<OnePort> values =
          series.computeIfAbsent(Set.of(load.first(), load.second()), s -> new ArrayList<>());
      if (on.contains(load)) {
        values.add(load.value());
      }
    }
    series.forEach(
        (place, values) -> {
          Node[] ends = place.toArray(new Node[0]);
          add(branches, ends[0], ends[1], new OnePort.Series(values), hz);
        });
  }

  private static void add(List<Branch> to, Node first, Node second, OnePort value, double hz) {
    to.add(new Branch(first.index(), second.index(), OnePortImpedance.at(value, hz)));
  }

  private static int root(int[] merged, int node) {
    int root = node;
    while (merged[root] != root) {
      root = merged[root];
    }
    return root;
  }

  private static void join(int[] merged, int a, int b) {
    merged[root(merged, a)] = root(merged, b);
  }

  /** The port's impedance, from the part of the network that the port reaches. */
  private Ohms solve(List<Branch> branches, int[] merged) {
    int plus = root(merged, port.plus().index());
    int minus = root(merged, port.minus().index());
    if (plus == minus) {
      return Ohms.of(0, 0);
    }
    int[] reach = merged.clone();
    for (Branch branch : branches) {
      if (branch.z.isFinite()) {
        join(reach, branch.first, branch.second);
      }
    }
    if (root(reach, plus) != root(reach, minus)) {
      return Ohms.OPEN;
    }
    int[] row = new int[merged.length];
    int size = 0;
    for (int i = 0; i < merged.length; i++) {
      boolean unknown = merged[i] == i && i != minus && root(reach, i) == root(reach, plus);
      row[i] = unknown ? size++ : -1;
    }
    ZMatrixRMaj y = new ZMatrixRMaj(size, size);
    for (Branch branch : branches) {
      int a = row[root(merged, branch.first)];
      int b = row[root(merged, branch.second)];
      if (branch.z.isFinite() && a != b) {
        stamp(y, a, b, branch.z);
      }
    }
    ZMatrixRMaj drive = new ZMatrixRMaj(size, 1);
    drive.set(row[plus], 0, 1, 0);
    ZMatrixRMaj volts = new ZMatrixRMaj(size, 1);
    if (!CommonOps_ZDRM.solve(y, drive, volts)) {
      return Ohms.UNDETERMINED;
    }
    ZMatrixRMaj residual = new ZMatrixRMaj(size, 1);
    CommonOps_ZDRM.mult(y, volts, residual);
    CommonOps_ZDRM.subtract(residual, drive, residual);
    double scale = 1 + NormOps_ZDRM.normF(y) * NormOps_ZDRM.normF(volts);
    boolean good = NormOps_ZDRM.normF(residual) <= LARGEST_RESIDUAL * scale;
    return good
        ? Ohms.of(volts.getReal(row[plus], 0), volts.getImag(row[plus], 0))
        : Ohms.UNDETERMINED;
  }

  private static void stamp(ZMatrixRMaj to, int a, int b, Ohms z) {
    double square = z.re() * z.re() + z.im() * z.im();
    double re = z.re() / square;
    double im = -z.im() / square;
    add(to, a, a, re, im);
    add(to, b, b, re, im);
    add(to, a, b, -re, -im);
    add(to, b, a, -re, -im);
  }

  private static void add(ZMatrixRMaj to, int row, int column, double re, double im) {
    if (row >= 0 && column >= 0) {
      to.set(row, column, to.getReal(row, column) + re, to.getImag(row, column) + im);
    }
  }
}
