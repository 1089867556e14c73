package loadmark.solve;

import static java.util.Objects.requireNonNull;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The change of one place at each frequency of a block. A workspace: not shared between threads.
 *
 * <p>The network around the place is a bilinear function of what stands there: with n·I = d·V at
 * the place and one volt at the port, V/n = I/d = N/D and Y = R + (n·Po + d·Ps)/D, where D = n·Do +
 * d·Ds. All are sums of products of the branches left, so that nothing cancels but in N, where a
 * balanced bridge does. By Tellegen's theorem networks that differ in one place alone differ by Y'
 * − Y = V·I' − V'·I there: a product, never a difference of two admittances.
 */
final class PlaceBlock {

  /**
   * What the port shows with one thing or another at the place.
   *
   * @param admittance {@code null} where the port is open by topology
   * @param share V/n = I/d at the place with one volt at the port
   * @param below D
   */
  record Side(@Nullable Tracked admittance, Tracked share, Tracked below) {}

  /**
   * A node of the place that is not of the port: its voltage is (n·open + d·joined)/D, and it
   * changes by (n′·d − n·d′)·swing·N/(D·D′).
   */
  private record Inner(
      int node, @Nullable Tracked open, @Nullable Tracked joined, @Nullable Tracked swing) {}

  private final PlaceReduction reduction;
  private final BranchBlock branches;
  private final Algebra algebra;
  private final List<Inner> inners = new ArrayList<>(2);
  private int n;

  private @Nullable Tracked rest;
  private @Nullable Tracked openTop;
  private @Nullable Tracked joinedTop;
  private @Nullable Tracked openBelow;
  private @Nullable Tracked joinedBelow;
  private @Nullable Tracked drive;

  PlaceBlock(PlaceReduction reduction, Algebra algebra, int size, boolean traces) {
    this.reduction = reduction;
    this.algebra = algebra;
    Storage storage = Storage.of(reduction.elimination(), true);
    branches = new BranchBlock(reduction.elimination(), storage, size, traces);
  }

  /** Takes over what the main elimination has left and reduces it. */
  void reduce(BranchBlock main, Standing.Pair[] pairs, double[] largestShare, int frequencies) {
    n = frequencies;
    BranchBlock.Source source =
        new BranchBlock.Source() {
          @Override
          public void write(int branch, double[] re, double[] im) {
            gather(branch, re, im, main, pairs);
          }
        };
    branches.eliminate(source, largestShare, n);
    inners.clear();
    int plus = reduction.plus();
    int minus = reduction.minus();
    int a = reduction.first();
    int b = reduction.second();
    boolean aAtPort = a == plus || a == minus;
    boolean bAtPort = b == plus || b == minus;
    if (aAtPort && bAtPort) {
      acrossPort();
    } else if (aAtPort || bAtPort) {
      besidePort(aAtPort ? a : b, aAtPort ? b : a);
    } else {
      apart(a, b);
    }
  }

  private void gather(
      int branch, double[] re, double[] im, BranchBlock main, Standing.Pair[] pairs) {
    boolean first = true;
    for (PlaceReduction.Input input : reduction.inputs(branch)) {
      double[] fromRe;
      double[] fromIm;
      if (input.isPlace()) {
        Standing.Pair pair = pairs[input.from()];
        Standing other = input.from() < reduction.place() ? pair.with() : pair.without();
        Tracked y = requireNonNull(algebra.over(other.d(), requireNonNull(other.n())));
        fromRe = y.re;
        fromIm = y.im;
      } else {
        fromRe = main.re(input.from());
        fromIm = main.im(input.from());
      }
      if (first) {
        System.arraycopy(fromRe, 0, re, 0, n);
        System.arraycopy(fromIm, 0, im, 0, n);
      } else {
        Kernels.add(re, fromRe, n);
        Kernels.add(im, fromIm, n);
      }
      first = false;
    }
  }

  private @Nullable Tracked left(int a, int b) {
    int branch = reduction.elimination().left(a, b);
    return branch < 0
        ? null
        : algebra.view(branches.re(branch), branches.im(branch), branches.rounding(branch));
  }

  private void acrossPort() {
    rest = null;
    openTop = left(reduction.plus(), reduction.minus());
    joinedTop = algebra.one();
    openBelow = algebra.one();
    joinedBelow = null;
    drive = algebra.one();
  }

  /** One node of the place is of the port, the other an inner one. */
  private void besidePort(int shared, int inner) {
    boolean atPlus = shared == reduction.plus();
    Tracked toFar = left(atPlus ? reduction.minus() : reduction.plus(), inner);
    Tracked across = left(shared, inner);
    rest = left(reduction.plus(), reduction.minus());
    openTop = algebra.times(toFar, across);
    joinedTop = toFar;
    openBelow = algebra.plus(toFar, across);
    joinedBelow = algebra.one();
    drive = toFar;
    Tracked one = algebra.one();
    inners.add(
        atPlus
            ? new Inner(inner, across, one, algebra.minus(null, one))
            : new Inner(inner, toFar, null, one));
  }

  private void apart(int a, int b) {
    Tracked plusA = left(reduction.plus(), a);
    Tracked plusB = left(reduction.plus(), b);
    Tracked minusA = left(reduction.minus(), a);
    Tracked minusB = left(reduction.minus(), b);
    Tracked across = left(a, b);
    Tracked atA = algebra.plus(plusA, minusA);
    Tracked atB = algebra.plus(plusB, minusB);
    Tracked atPlus = algebra.plus(plusA, plusB);
    rest = left(reduction.plus(), reduction.minus());
    joinedBelow = algebra.plus(atA, atB);
    joinedTop = algebra.times(atPlus, algebra.plus(minusA, minusB));
    openBelow = algebra.plus(algebra.times(atA, atB), algebra.times(across, joinedBelow));
    Tracked throughA = algebra.times(algebra.times(plusA, minusA), atB);
    Tracked throughB = algebra.times(algebra.times(plusB, minusB), atA);
    openTop = algebra.plus(algebra.plus(throughA, throughB), algebra.times(across, joinedTop));
    drive = algebra.minus(algebra.times(plusA, minusB), algebra.times(plusB, minusA));
    Tracked over = algebra.times(across, atPlus);
    inners.add(new Inner(a, algebra.plus(algebra.times(plusA, atB), over), atPlus, atB));
    inners.add(
        new Inner(
            b, algebra.plus(algebra.times(plusB, atA), over), atPlus, algebra.minus(null, atA)));
  }

  /** What the port shows with this at the place. */
  Side with(Standing at) {
    Tracked below =
        requireNonNull(
            algebra.plus(algebra.times(at.n(), openBelow), algebra.times(at.d(), joinedBelow)));
    Tracked top = algebra.plus(algebra.times(at.n(), openTop), algebra.times(at.d(), joinedTop));
    return new Side(
        algebra.plus(rest, algebra.over(top, below)),
        requireNonNull(algebra.over(drive, below)),
        below);
  }

  /**
   * By how much the admittance falls from one thing at the place to another; {@code null} where
   * nothing changes.
   */
  @Nullable Tracked fall(Side before, Side after, Standing.Pair pair) {
    return algebra.times(algebra.times(before.share(), after.share()), pair.difference());
  }

  /**
   * Finds the voltages of all nodes of the reduction, and adds what the roundings of its
   * eliminations do to the port's admittance.
   */
  void trace(Side before, Side after, Standing.Pair pair, Powers powers) {
    branches.node(reduction.plus()).set(1, n);
    branches.node(reduction.minus()).set(0, n);
    Tracked swing = algebra.over(algebra.times(before.share(), pair.difference()), after.below());
    for (Inner inner : inners) {
      branches
          .node(inner.node())
          .set(
              volts(inner, pair.without(), before),
              volts(inner, pair.with(), after),
              algebra.times(swing, inner.swing()),
              n);
    }
    branches.trace(powers, n);
  }

  private @Nullable Tracked volts(Inner inner, Standing at, Side side) {
    Tracked top =
        algebra.plus(algebra.times(at.n(), inner.open()), algebra.times(at.d(), inner.joined()));
    return algebra.over(top, side.below());
  }

  /** One of the main elimination's terminals, after {@link #trace}. */
  NodeBlock node(int terminal) {
    return branches.node(reduction.node(terminal));
  }
}
