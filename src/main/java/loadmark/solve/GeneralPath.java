package loadmark.solve;

import java.util.List;
import loadmark.equation.Branch;
import loadmark.equation.ChangedPlace;
import loadmark.equation.ComparedNetwork;
import loadmark.equation.Constraint;
import loadmark.equation.Law;
import org.jspecify.annotations.Nullable;

/**
 * Solves a case at one frequency where the elimination of branches alone does not do: at and near
 * resonances of inner nodes, at infinite admittances, and with parts that no branch admittance
 * describes. Branches are eliminated as far as that is safe; the rest is a system of modified nodal
 * equations (Ho, Ruehli, Brennan, The modified nodal approach to network analysis, 1975) whose
 * unknowns are the voltages left and the currents of places, joins and constraints. All to about 32
 * digits.
 */
final class GeneralPath {
  /** What one operation may lose. */
  private static final double UNIT = 0x1p-102;

  /** A margin for what the first-order estimates leave out. */
  private static final double MARGIN = 64;

  private static final double FINAL_ROUNDING = 0x1p-51;

  private final CasePlan plan;
  private final ComparedNetwork network;

  GeneralPath(CasePlan plan) {
    this.plan = plan;
    network = plan.network;
  }

  /** Whether the elimination of branches alone does not do at any frequency. */
  boolean isNeeded() {
    return !network.constraints().isEmpty() || plan.isInterrupted();
  }

  /** n·I = d·V at a place. */
  private record WideStanding(WideComplex n, WideComplex d) {}

  /** The equations of one of the two networks and their solution with one volt at the port. */
  private final class Network {
    final WideGraph graph = new WideGraph(network.nodes());
    final WideStanding[] standings = new WideStanding[network.places().size()];
    final int[] unknown = new int[network.nodes()];
    final WideSystem system;
    final int firstPlace;
    final int port;
    final boolean driven;
    WideComplex @Nullable [] solution;
    WideComplex @Nullable [] factors;

    /** What rounding can do to the solution for the port, absolute. */
    double error;

    Network(WideLaw laws, double re, double im, boolean with, boolean driven) {
      this.driven = driven;
      int count = network.nodes();
      boolean[] kept = new boolean[count];
      int joins = 0;
      List<Branch> branches = network.branches();
      boolean[] joined = new boolean[branches.size()];
      for (int i = 0; i < joined.length; i++) {
        Branch branch = branches.get(i);
        WideComplex y = laws.admittance(branch.law());
        if (y == null) {
          joined[i] = true;
          joins++;
          kept[branch.first()] = true;
          kept[branch.second()] = true;
        } else if (!y.isZero()) {
          graph.add(branch.first(), branch.second(), y);
        }
      }
      int currents = standings.length + joins;
      for (Constraint constraint : network.constraints()) {
        for (Constraint.Terminals terminals : constraint.ports()) {
          kept[terminals.first()] = true;
          kept[terminals.second()] = true;
          currents++;
        }
      }
      boolean[] gone = new boolean[count];
      for (Elimination.Star star : plan.main.stars()) {
        gone[star.node] = true;
      }
      for (int node : graph.eliminate(plan.main.stars(), kept)) {
        gone[node] = false;
      }
      int size = 0;
      for (int i = 0; i < count; i++) {
        unknown[i] = gone[i] || i == ComparedNetwork.MINUS ? -1 : size++;
      }
      firstPlace = size;
      port = size + currents;
      system = new WideSystem(port + 1);
      addNodes(gone);
      int at = addPlaces(laws, with, firstPlace);
      for (int i = 0; i < joined.length; i++) {
        if (joined[i]) {
          Branch branch = branches.get(i);
          addCurrent(branch.first(), branch.second(), at);
          addVoltage(at++, branch.first(), branch.second(), WideComplex.ONE);
        }
      }
      for (Constraint constraint : network.constraints()) {
        at = addConstraint(constraint, re, im, at);
      }
      addPort();
      system.factor();
    }

    private void addNodes(boolean[] gone) {
      for (int i = 0; i < gone.length; i++) {
        if (gone[i]) {
          continue;
        }
        for (int other : graph.neighbours(i)) {
          WideComplex y = graph.admittance(i, other);
          add(unknown[i], unknown[i], y);
          add(unknown[i], unknown[other], y.negate());
        }
      }
    }

    private int addPlaces(WideLaw laws, boolean with, int from) {
      int at = from;
      for (int i = 0; i < standings.length; i++) {
        ChangedPlace place = network.places().get(i);
        standings[i] = standing(laws, with ? place.with() : place.without(), place.series());
        addCurrent(place.first(), place.second(), at);
        addVoltage(at, place.first(), place.second(), standings[i].d);
        add(at, at, standings[i].n.negate());
        at++;
      }
      return at;
    }

    private int addConstraint(Constraint constraint, double re, double im, int from) {
      List<Constraint.Terminals> ports = constraint.ports();
      int count = ports.size();
      double[] voltage = new double[2 * count * count];
      double[] current = new double[2 * count * count];
      constraint.equations().at(re, im, voltage, current);
      for (int i = 0; i < count; i++) {
        addCurrent(ports.get(i).first(), ports.get(i).second(), from + i);
        for (int j = 0; j < count; j++) {
          int k = 2 * (i * count + j);
          Constraint.Terminals of = ports.get(j);
          WideComplex factor = WideComplex.of(voltage[k], voltage[k + 1]);
          addVoltage(from + i, of.first(), of.second(), factor);
          add(from + i, from + j, WideComplex.of(current[k], current[k + 1]));
        }
      }
      return from + count;
    }

    /** The port's own current, and either its voltage or that current is 1. */
    private void addPort() {
      add(unknown[ComparedNetwork.PLUS], port, WideComplex.ONE.negate());
      if (driven) {
        add(port, unknown[ComparedNetwork.PLUS], WideComplex.ONE);
      } else {
        add(port, port, WideComplex.ONE);
      }
    }

    private void add(int i, int j, WideComplex value) {
      if (i >= 0 && j >= 0 && !value.isZero()) {
        system.add(i, j, value);
      }
    }

    private void addCurrent(int first, int second, int current) {
      add(unknown[first], current, WideComplex.ONE);
      add(unknown[second], current, WideComplex.ONE.negate());
    }

    private void addVoltage(int equation, int first, int second, WideComplex factor) {
      add(equation, unknown[first], factor);
      add(equation, unknown[second], factor.negate());
    }

    /** Solves for what the port answers; false if nothing does. */
    boolean solve() {
      int answer = driven ? port : unknown[ComparedNetwork.PLUS];
      solution = system.solve(port);
      factors = solution == null ? null : system.solveTransposed(answer);
      if (solution == null || factors == null) {
        return false;
      }
      double[] volts = new double[2 * unknown.length];
      double[] multipliers = new double[2 * unknown.length];
      for (int i = 0; i < unknown.length; i++) {
        if (unknown[i] >= 0) {
          volts[2 * i] = solution[unknown[i]].re().hi();
          volts[2 * i + 1] = solution[unknown[i]].im().hi();
          multipliers[2 * i] = factors[unknown[i]].re().hi();
          multipliers[2 * i + 1] = factors[unknown[i]].im().hi();
        }
      }
      double dense = system.size() * system.rounding(solution, factors);
      error = UNIT * (dense + graph.rounding(volts, multipliers));
      return true;
    }

    WideComplex answer() {
      return value(solution, driven ? port : unknown[ComparedNetwork.PLUS]);
    }

    WideComplex voltage(ChangedPlace place) {
      return at(place.first()).minus(at(place.second()));
    }

    private WideComplex at(int node) {
      return unknown[node] < 0 ? WideComplex.ZERO : value(solution, unknown[node]);
    }

    WideComplex current(int place) {
      return value(solution, firstPlace + place);
    }

    WideComplex factor(int place) {
      return value(factors, firstPlace + place);
    }
  }

  private static WideComplex value(WideComplex @Nullable [] of, int i) {
    if (of == null) {
      throw new IllegalStateException("asked for a solution where there is none");
    }
    return of[i];
  }

  private static WideStanding standing(WideLaw laws, Law law, boolean series) {
    if (series) {
      WideComplex z = laws.impedance(law);
      return z == null
          ? new WideStanding(WideComplex.ONE, WideComplex.ZERO)
          : new WideStanding(z, WideComplex.ONE);
    }
    WideComplex y = laws.admittance(law);
    return y == null
        ? new WideStanding(WideComplex.ZERO, WideComplex.ONE)
        : new WideStanding(WideComplex.ONE, y);
  }

  /** Solves at one frequency and writes what it finds. */
  void solve(double[] values, Frequencies s, int i, Solutions to) {
    WideLaw laws = new WideLaw(values, s, i);
    double re = s.re()[i];
    double im = s.im()[i];
    Network without = new Network(laws, re, im, false, true);
    Network with = network.places().isEmpty() ? without : new Network(laws, re, im, true, true);
    boolean foundWithout = without.solve();
    boolean foundWith = with == without ? foundWithout : with.solve();
    if (!laws.isInRange()) {
      to.without().set(i, Solutions.State.UNDETERMINED);
      to.with().set(i, Solutions.State.UNDETERMINED);
      to.change().set(i, Solutions.State.UNDETERMINED);
      return;
    }
    writeImpedance(
        foundWithout ? without : new Network(laws, re, im, false, false), to.without(), i);
    writeImpedance(foundWith ? with : new Network(laws, re, im, true, false), to.with(), i);
    if (foundWithout && foundWith) {
      writeChange(without, with, to.change(), i);
    } else {
      to.change().set(i, Solutions.State.UNDETERMINED);
    }
    Solutions.decide(to, i);
  }

  private static void writeImpedance(Network network, Solutions.Quantity to, int i) {
    if (!network.driven && !network.solve()) {
      to.set(i, Solutions.State.UNDETERMINED);
      return;
    }
    WideComplex answer = network.answer();
    boolean nothing = answer.size() <= MARGIN * network.error;
    double error = FINAL_ROUNDING + MARGIN * network.error / answer.size();
    if (nothing && network.driven) {
      to.set(i, Solutions.State.INFINITE);
    } else if (nothing) {
      to.set(i, 0, 0, 0);
    } else {
      write(network.driven ? answer.inverse() : answer, error, to, i);
    }
  }

  private static void write(WideComplex value, double error, Solutions.Quantity to, int i) {
    double re = value.re().hi();
    double im = value.im().hi();
    if (Double.isFinite(re) && Double.isFinite(im) && error < 1) {
      to.set(i, re, im, error);
    } else {
      to.set(i, Solutions.State.UNDETERMINED);
    }
  }

  /**
   * With M·x = e in one network and M′·x′ = e in the other, and Mᵀ·λ = e of the port's current, Y′
   * − Y = −λᵀ·(M′ − M)·x′, where only the places' rows differ.
   */
  private void writeChange(Network without, Network with, Solutions.Quantity to, int i) {
    double lost = (relative(without) + relative(with) + UNIT) * MARGIN;
    WideComplex change = WideComplex.ZERO;
    double error = 0;
    for (int k = 0; k < network.places().size(); k++) {
      ChangedPlace place = network.places().get(k);
      WideStanding standing = without.standings[k];
      WideComplex volts = with.voltage(place);
      WideComplex current = with.current(k);
      WideComplex factor = without.factor(k);
      WideComplex misses = standing.d.times(volts).minus(standing.n.times(current));
      change = change.plus(factor.times(misses));
      double d = standing.d.size();
      double n = standing.n.size();
      double around = place.series() ? without.answer().size() : 1;
      error += around * (d * volts.size() + n * current.size());
      error += factor.size() * (d * Math.max(1, volts.size()) + n * with.answer().size());
    }
    WideComplex y = with.answer();
    if (change.size() <= lost * error) {
      to.set(i, 0, 0, change.isZero() && error == 0 ? 0 : Double.POSITIVE_INFINITY);
    } else {
      double relative = FINAL_ROUNDING + lost * error / change.size() + relative(with) * MARGIN;
      write(change.over(y).negate(), relative, to, i);
    }
  }

  private static double relative(Network network) {
    return network.error / network.answer().size();
  }
}
