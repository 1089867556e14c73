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
      solution = system.solve(system.unit(port));
      factors = solution == null ? null : system.solveTransposed(system.unit(answer));
      error = rounding(solution, factors);
      return solution != null && factors != null;
    }

    /** What rounding can do to yᵀ·M·x. */
    private double rounding(WideComplex @Nullable [] x, WideComplex @Nullable [] y) {
      if (x == null || y == null) {
        return Double.POSITIVE_INFINITY;
      }
      double dense = system.size() * system.rounding(x, y);
      return UNIT * (dense + graph.rounding(nodes(x), nodes(y)));
    }

    /** The part of a vector that belongs to nodes, re and im in turn, for all nodes. */
    private double[] nodes(WideComplex[] of) {
      double[] volts = new double[2 * unknown.length];
      for (int i = 0; i < unknown.length; i++) {
        if (unknown[i] >= 0) {
          volts[2 * i] = of[unknown[i]].re().hi();
          volts[2 * i + 1] = of[unknown[i]].im().hi();
        }
      }
      return volts;
    }

    /** The error of d·V − n·I at a place. */
    double errorOfMiss(ChangedPlace place, int k, WideStanding of) {
      WideComplex[] wanted = system.zeros();
      set(wanted, unknown[place.first()], of.d);
      set(wanted, unknown[place.second()], of.d.negate());
      wanted[firstPlace + k] = of.n.negate();
      return rounding(solution, system.solveTransposed(wanted));
    }

    private static void set(WideComplex[] vector, int i, WideComplex value) {
      if (i >= 0) {
        vector[i] = value;
      }
    }

    /** The error of the multiplier of a place's equation. */
    double errorOfFactor(int k) {
      return rounding(system.solve(system.unit(firstPlace + k)), factors);
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

  /**
   * Solves at one frequency.
   *
   * @param to of one frequency
   * @return whether every value was of a size that can be worked with
   */
  boolean solve(double[] values, Frequencies s, int i, Solutions to) {
    WideLaw laws = new WideLaw(values, s, i);
    double re = s.re()[i];
    double im = s.im()[i];
    Network without = new Network(laws, re, im, false, true);
    Network with = network.places().isEmpty() ? without : new Network(laws, re, im, true, true);
    boolean foundWithout = without.solve();
    boolean foundWith = with == without ? foundWithout : with.solve();
    if (!laws.isInRange()) {
      return false;
    }
    writeImpedance(foundWithout ? without : new Network(laws, re, im, false, false), to.without());
    writeImpedance(foundWith ? with : new Network(laws, re, im, true, false), to.with());
    if (foundWithout && foundWith) {
      writeChange(laws, without, with, to.change());
    } else {
      to.change().set(0, Solutions.State.UNDETERMINED);
    }
    to.decide();
    return true;
  }

  private static void writeImpedance(Network network, Solutions.Quantity to) {
    if (!network.driven && !network.solve()) {
      to.set(0, Solutions.State.UNDETERMINED);
      return;
    }
    WideComplex answer = network.answer();
    boolean nothing = answer.size() <= MARGIN * network.error;
    double error = FINAL_ROUNDING + MARGIN * network.error / answer.size();
    if (nothing && network.driven) {
      to.set(0, Solutions.State.INFINITE);
    } else if (nothing) {
      to.set(0, 0, 0, 0);
    } else {
      write(network.driven ? answer.inverse() : answer, error, to);
    }
  }

  private static void write(WideComplex value, double error, Solutions.Quantity to) {
    double re = value.re().hi();
    double im = value.im().hi();
    if (Double.isFinite(re) && Double.isFinite(im) && error < 1) {
      to.set(0, re, im, error);
    } else {
      to.set(0, Solutions.State.UNDETERMINED);
    }
  }

  /**
   * With M·x = e in one network and M′·x′ = e in the other, and Mᵀ·λ = e of the port's current, Y′
   * − Y = −λᵀ·(M′ − M)·x′, where only the places' rows differ.
   */
  private void writeChange(WideLaw laws, Network without, Network with, Solutions.Quantity to) {
    WideComplex change = WideComplex.ZERO;
    double error = 0;
    for (int k = 0; k < network.places().size(); k++) {
      ChangedPlace place = network.places().get(k);
      WideStanding standing = weights(laws, place, without.standings[k]);
      WideComplex volts = standing.d.times(with.voltage(place));
      WideComplex current = standing.n.times(with.current(k));
      WideComplex factor = without.factor(k);
      WideComplex miss = volts.minus(current);
      change = change.plus(factor.times(miss));
      double ofMiss = with.errorOfMiss(place, k, standing) + UNIT * (volts.size() + current.size());
      error += factor.size() * ofMiss + miss.size() * without.errorOfFactor(k);
    }
    error *= MARGIN;
    if (change.size() <= error) {
      to.set(0, 0, 0, network.places().isEmpty() ? 0 : Double.POSITIVE_INFINITY);
    } else {
      double relative = FINAL_ROUNDING + error / change.size() + relative(with) * MARGIN;
      write(change.over(with.answer()).negate(), relative, to);
    }
  }

  /** What to multiply V′ and I′ by so that what is common to both networks drops out. */
  private static WideStanding weights(WideLaw laws, ChangedPlace place, WideStanding without) {
    WideComplex removed =
        place.series() ? laws.impedance(place.removed()) : laws.admittance(place.removed());
    WideComplex added =
        place.series() ? laws.impedance(place.added()) : laws.admittance(place.added());
    if (removed == null || added == null) {
      return without;
    }
    WideComplex difference = removed.minus(added);
    return place.series()
        ? new WideStanding(difference, WideComplex.ZERO)
        : new WideStanding(WideComplex.ZERO, difference);
  }

  private static double relative(Network network) {
    return network.error / network.answer().size();
  }
}
