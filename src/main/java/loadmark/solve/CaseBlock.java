package loadmark.solve;

import static java.util.Objects.requireNonNull;

import java.util.Arrays;
import java.util.List;
import loadmark.equation.Branch;
import loadmark.equation.ChangedPlace;
import loadmark.equation.ComparedNetwork;
import loadmark.equation.Law;
import org.jspecify.annotations.Nullable;

/** Solves a case at a block of frequencies. A workspace: not shared between threads. */
final class CaseBlock {
  private static final double UNIT = 0x1p-53;

  /** Rounding of one element's admittance, in units of 2⁻⁵³, that of the frequency included. */
  private static final double ELEMENT = 4;

  private static final double QUOTIENT = 8;

  /**
   * Without estimates, a result is found again another way where an eliminated branch was more than
   * this many times the sum of its star, …
   */
  private static final double LARGEST_SHARE = 50;

  /**
   * … and with them, where the eliminations may have lost more than this many times what a rounding
   * of every element would do, or a relative error could be larger than {@link #MOST_ERROR}.
   */
  private static final double MOST_GROWTH = 300;

  private static final double MOST_ERROR = 1e-10;

  /**
   * A smaller change, behind thousands of decibels, is left at 0 with an unknown relative error:
   * its factors may have left the range of a double.
   */
  private static final double NO_CHANGE = 0x1p-400;

  private final CasePlan plan;
  private final boolean estimates;
  private final LawBlock laws;
  private final BranchBlock main;
  private final Algebra algebra;
  private final PlaceBlock[] places;
  private final Standing.Pair[] pairs;
  private final double[] largestShare;
  private final Powers stars;
  private final Powers elements;
  private final Powers own;
  private final double[] weight;

  CaseBlock(CasePlan plan, Storage storage, int size, boolean estimates) {
    this.plan = plan;
    this.estimates = estimates;
    laws = new LawBlock(size);
    main = new BranchBlock(plan.main, storage, size, estimates);
    algebra = new Algebra(size, estimates);
    places = new PlaceBlock[plan.reductions.size()];
    for (int i = 0; i < places.length; i++) {
      places[i] = new PlaceBlock(plan.reductions.get(i), algebra, size, estimates);
    }
    pairs = new Standing.Pair[plan.network.places().size()];
    largestShare = new double[size];
    stars = new Powers(size);
    elements = new Powers(size);
    own = new Powers(size);
    weight = new double[size];
  }

  /**
   * Solves a block.
   *
   * @param values of all elements
   * @param from the first frequency
   * @param n how many
   * @param to where the results go
   * @param doubtful is set where a result is not to be trusted
   */
  void solve(double[] values, Frequencies s, int from, int n, Solutions to, boolean[] doubtful) {
    algebra.begin(n);
    laws.begin(s, from, n);
    List<Branch> branches = plan.network.branches();
    Arrays.fill(largestShare, 0, n, 0);
    main.eliminate(
        (branch, re, im) -> laws.admittance((Law.Sum) branches.get(branch).law(), values, re, im),
        largestShare,
        n);
    stand(values, n);
    if (estimates) {
      stars.clear(n);
      elements.clear(n);
    }
    if (places.length == 0) {
      solveUnchanged(values, from, n, to, doubtful);
    } else {
      solveChanged(values, from, n, to, doubtful);
    }
    if (!laws.isInRange()) {
      Arrays.fill(doubtful, from, from + n, true);
    }
    double largest = LARGEST_SHARE * LARGEST_SHARE;
    for (int i = 0; i < n; i++) {
      if (!(largestShare[i] <= largest)) {
        doubtful[from + i] = true;
      }
    }
  }

  private void stand(double[] values, int n) {
    for (int i = 0; i < pairs.length; i++) {
      ChangedPlace place = plan.network.places().get(i);
      Standing without = standing(place.without(), place.series(), values, n);
      Standing with = standing(place.with(), place.series(), values, n);
      Tracked difference;
      if (!place.isDifference()) {
        difference =
            algebra.minus(
                algebra.times(with.n(), without.d()), algebra.times(without.n(), with.d()));
      } else if (place.series()) {
        difference =
            algebra.minus(
                standing(place.added(), true, values, n).n(),
                standing(place.removed(), true, values, n).n());
      } else {
        difference =
            algebra.minus(
                standing(place.removed(), false, values, n).d(),
                standing(place.added(), false, values, n).d());
      }
      pairs[i] = new Standing.Pair(without, with, difference);
    }
  }

  private Standing standing(Law law, boolean series, double[] values, int n) {
    if (!(law instanceof Law.Sum sum)) {
      return law == Law.Fixed.OPEN
          ? new Standing(algebra.one(), null)
          : new Standing(null, algebra.one());
    }
    Tracked value = algebra.take(0);
    if (series) {
      laws.impedance(sum, values, value.re, value.im);
    } else {
      laws.admittance(sum, values, value.re, value.im);
    }
    if (estimates) {
      if (series) {
        laws.impedanceSize(sum, values, value.error);
      } else {
        laws.admittanceSize(sum, values, value.error);
      }
      Kernels.scale(value.error, ELEMENT + sum.size(), n);
      Kernels.relative(value.error, value.re, value.im, n);
    }
    return series ? new Standing(value, algebra.one()) : new Standing(algebra.one(), value);
  }

  private void solveUnchanged(double[] values, int from, int n, Solutions to, boolean[] doubtful) {
    int left = plan.main.left(ComparedNetwork.PLUS, ComparedNetwork.MINUS);
    Tracked y = algebra.take(main.rounding(left));
    System.arraycopy(main.re(left), 0, y.re, 0, n);
    System.arraycopy(main.im(left), 0, y.im, 0, n);
    if (estimates) {
      main.node(ComparedNetwork.PLUS).set(1, n);
      main.node(ComparedNetwork.MINUS).set(0, n);
      trace(values, n);
    }
    writeImpedance(y, stars.without, elements.without, to.without(), from, n, doubtful);
    to.with().copy(to.without(), from, n);
    to.change().fill(0, 0, from, n);
  }

  private void solveChanged(double[] values, int from, int n, Solutions to, boolean[] doubtful) {
    int last = places.length - 1;
    Tracked yWithout = null;
    Tracked yWith = null;
    Tracked fall = null;
    for (int i = 0; i <= last; i++) {
      Standing.Pair pair = pairs[plan.reductions.get(i).place()];
      places[i].reduce(main, pairs, largestShare, n);
      PlaceBlock.Side before = places[i].with(pair.without());
      PlaceBlock.Side after = places[i].with(pair.with());
      fall = algebra.plus(fall, places[i].fall(before, after, pair));
      yWithout = i == 0 ? before.admittance() : yWithout;
      yWith = after.admittance();
      if (estimates) {
        own.clear(n);
        places[i].trace(before, after, pair, own);
        Kernels.add(stars.change, own.change, n);
        if (i == 0) {
          Kernels.add(stars.without, own.without, n);
        }
        if (i == last) {
          Kernels.add(stars.with, own.with, n);
        }
      }
    }
    if (estimates) {
      for (int i = 0; i < plan.terminals.length; i++) {
        NodeBlock node = main.node(plan.terminals[i]);
        node.copy(places[0].node(i), n);
        for (int k = 1; k <= last; k++) {
          node.append(places[k].node(i), n);
        }
      }
      trace(values, n);
    }
    Tracked y = requireNonNull(yWithout);
    writeImpedance(y, stars.without, elements.without, to.without(), from, n, doubtful);
    y = requireNonNull(yWith);
    writeImpedance(y, stars.with, elements.with, to.with(), from, n, doubtful);
    writeChange(fall, y, to, from, n, doubtful);
  }

  private void trace(double[] values, int n) {
    main.trace(stars, n);
    for (Branch branch : plan.network.branches()) {
      Law.Sum law = (Law.Sum) branch.law();
      laws.admittanceSize(law, values, weight);
      Kernels.scale(weight, ELEMENT + law.size(), n);
      elements.add(weight, main.node(branch.first()), main.node(branch.second()), n);
    }
  }

  private void writeImpedance(
      Tracked y,
      double[] lost,
      double[] given,
      Solutions.Quantity to,
      int from,
      int n,
      boolean[] doubtful) {
    Tracked z = requireNonNull(algebra.over(algebra.one(), y));
    to.copy(z.re, z.im, from, n);
    double[] error = to.error();
    if (error != null) {
      judge(y, y, 0, lost, given, error, from, n, doubtful);
    }
  }

  /**
   * The relative error of a number, and whether it is small enough or the result next to nothing.
   */
  private static void judge(
      Tracked what,
      Tracked result,
      double nothing,
      double[] lost,
      double[] given,
      double[] error,
      int from,
      int n,
      boolean[] doubtful) {
    for (int i = 0; i < n; i++) {
      double abs = Math.abs(what.re[i]) + Math.abs(what.im[i]);
      double sum = (lost[i] + given[i]) / abs;
      error[from + i] = (QUOTIENT + what.error[i] + 1.5 * sum) * UNIT;
      boolean good = lost[i] <= MOST_GROWTH * (given[i] + abs) && error[from + i] <= MOST_ERROR;
      good |= Math.abs(result.re[i]) + Math.abs(result.im[i]) < nothing;
      doubtful[from + i] |= !good;
    }
  }

  private void writeChange(
      @Nullable Tracked fall, Tracked y, Solutions to, int from, int n, boolean[] doubtful) {
    if (fall == null) {
      to.change().fill(0, 0, from, n);
      return;
    }
    Tracked ratio = requireNonNull(algebra.over(fall, y));
    to.change().copy(ratio.re, ratio.im, from, n);
    double[] error = to.change().error();
    if (error != null) {
      judge(fall, ratio, NO_CHANGE, stars.change, elements.change, error, from, n, doubtful);
      for (int i = from; i < from + n; i++) {
        error[i] += to.with().error(i);
      }
    }
    for (int i = 0; i < n; i++) {
      if (Math.abs(ratio.re[i]) + Math.abs(ratio.im[i]) < NO_CHANGE) {
        to.change().set(from + i, 0, 0, Double.POSITIVE_INFINITY);
      }
    }
  }
}
