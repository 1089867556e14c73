package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import loadmark.equation.ComparedNetwork;
import loadmark.equation.ComparedNetwork.Topology;
import loadmark.equation.Equations;
import loadmark.network.Load;
import loadmark.solve.CaseSolver;
import loadmark.solve.Frequencies;
import loadmark.solve.Solutions;
import org.jspecify.annotations.Nullable;

/** A case and its reference where one topology holds: at DC, or at all other frequencies. */
final class Regime {
  private final Topology without;
  private final Topology with;
  private final double[] values;

  /** Whether anything differs between the two; if not, the change is 0 and known exactly. */
  private final boolean changed;

  /** Of both where the port's nodes are connected in both, else of the one where they are. */
  private final @Nullable CaseSolver solver;

  Regime(Equations equations, List<Load> loads, List<Load> against) {
    ComparedNetwork network = equations.compare(against, loads);
    without = network.without();
    with = network.with();
    values = equations.nominalValues();
    changed = network.isChanged();
    if (without == Topology.CONNECTED && with == Topology.CONNECTED) {
      solver = new CaseSolver(changed ? network : equations.compare(loads, loads));
    } else if (without == Topology.CONNECTED) {
      solver = new CaseSolver(equations.compare(against, against));
    } else if (with == Topology.CONNECTED) {
      solver = new CaseSolver(equations.compare(loads, loads));
    } else {
      solver = null;
    }
  }

  /** Solves at each frequency; {@code hz} is what the results say it was. */
  List<Loading> solve(Frequencies s, double[] hz) {
    Solutions solutions = solver == null ? null : solver.solve(values, s);
    List<Loading> loadings = new ArrayList<>(hz.length);
    for (int i = 0; i < hz.length; i++) {
      loadings.add(loading(solutions, i, hz[i]));
    }
    return loadings;
  }

  private Loading loading(@Nullable Solutions solutions, int i, double hz) {
    Ohms bare = ohms(without, solutions == null ? null : solutions.without(), i);
    Ohms loaded = ohms(with, solutions == null ? null : solutions.with(), i);
    boolean both = without == Topology.CONNECTED && with == Topology.CONNECTED;
    Change change =
        solutions != null && both ? change(solutions.change(), i) : extreme(bare, loaded);
    return new Loading(
        hz,
        bare,
        loaded,
        change,
        error(without, solutions == null ? null : solutions.without(), i),
        error(with, solutions == null ? null : solutions.with(), i),
        solutions != null && both && changed ? solutions.change().error(i) : 0);
  }

  private static Ohms ohms(Topology topology, Solutions.@Nullable Quantity solved, int i) {
    if (topology != Topology.CONNECTED || solved == null) {
      return topology == Topology.JOINED ? Ohms.of(0, 0) : Ohms.OPEN;
    }
    return switch (solved.state(i)) {
      case FINITE -> Ohms.of(solved.re(i), solved.im(i));
      case INFINITE -> Ohms.OPEN;
      case UNDETERMINED -> Ohms.UNDETERMINED;
    };
  }

  private static double error(Topology topology, Solutions.@Nullable Quantity solved, int i) {
    return topology != Topology.CONNECTED || solved == null ? 0 : solved.error(i);
  }

  private static Change change(Solutions.Quantity solved, int i) {
    return switch (solved.state(i)) {
      case FINITE -> Change.of(solved.re(i), solved.im(i));
      case INFINITE -> Change.UNBOUNDED;
      case UNDETERMINED -> Change.UNDETERMINED;
    };
  }

  /** The change where one impedance at least is open or 0 by topology. */
  private static Change extreme(Ohms without, Ohms with) {
    boolean undetermined = without.isUndetermined() || with.isUndetermined();
    boolean bothOpen = without.isOpen() && with.isOpen();
    boolean bothZero = without.isZero() && with.isZero();
    if (undetermined || bothOpen || bothZero) {
      return Change.UNDETERMINED;
    }
    return without.isOpen() || with.isZero() ? Change.of(-1, 0) : Change.UNBOUNDED;
  }
}
