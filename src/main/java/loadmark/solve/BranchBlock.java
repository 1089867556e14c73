package loadmark.solve;

import java.util.Arrays;

/**
 * The branch admittances of one graph at each frequency of a block, eliminated in a prepared order
 * by the star–mesh transform. The pivot is the sum of the branches that are there, so that nothing
 * small is lost in a diagonal (Grassmann, Taksar, Heyman, Regenerative analysis and steady state
 * distributions for Markov chains, 1985). A workspace: not shared between threads.
 */
final class BranchBlock {
  /** Rounding of what a star adds, in units of 2⁻⁵³, beside that of sums. */
  private static final double FILL = 8;

  /** Writes the branches that are given. */
  interface Source {
    void write(int branch, double[] re, double[] im);
  }

  private final Elimination elimination;
  private final Storage storage;
  private final double[][] re;
  private final double[][] im;
  private final double[] sumRe;
  private final double[] sumIm;

  // Only where errors are estimated.
  private final double[][] pivot;
  private final NodeBlock[] nodes;
  private final double[] growth;
  private final double[] weight;

  /**
   * A workspace.
   *
   * @param size the largest block
   * @param storage one that keeps all where errors are to be estimated
   * @param traces whether errors are to be estimated
   */
  BranchBlock(Elimination elimination, Storage storage, int size, boolean traces) {
    this.elimination = elimination;
    this.storage = storage;
    re = new double[storage.rooms][size];
    im = new double[storage.rooms][size];
    sumRe = new double[size];
    sumIm = new double[size];
    int stars = elimination.stars().length;
    pivot = new double[traces ? stars : 1][size];
    nodes = new NodeBlock[traces ? elimination.nodes() : 0];
    for (int i = 0; i < nodes.length; i++) {
      nodes[i] = new NodeBlock(size);
    }
    growth = new double[size];
    weight = new double[size];
  }

  /** How many doubles a frequency takes. */
  static int footprint(Elimination elimination, Storage storage, boolean traces) {
    int traced = traces ? elimination.stars().length + 6 * elimination.nodes() : 1;
    return 2 * storage.rooms + traced + 4;
  }

  /**
   * Eliminates all nodes that are not kept. Where errors are to be estimated, each star's members
   * become their shares of it.
   *
   * @param largestShare gets the largest square of a share if it is larger; not where errors are to
   *     be estimated
   */
  void eliminate(Source source, double[] largestShare, int n) {
    Elimination.Star[] stars = elimination.stars();
    boolean traces = nodes.length > 0;
    for (int k = 0; k < stars.length; k++) {
      write(storage.needed[k], source);
      int[] members = stars[k].members;
      if (members.length > 1) {
        sum(members, n);
        if (traces) {
          Kernels.size(pivot[k], sumRe, sumIm, n);
        }
        Kernels.inverse(sumRe, sumIm, sumRe, sumIm, n);
        spread(members, stars[k].targets, n);
        if (traces) {
          share(members[members.length - 1], n);
        } else {
          watch(members, largestShare, n);
        }
      } else if (traces && members.length == 1) {
        int only = storage.room[members[0]];
        Kernels.size(pivot[k], re[only], im[only], n);
        Arrays.fill(re[only], 0, n, 1);
        Arrays.fill(im[only], 0, n, 0);
      }
    }
    write(storage.needed[stars.length], source);
  }

  private void write(int[] needed, Source source) {
    for (int branch : needed) {
      source.write(branch, re(branch), im(branch));
    }
  }

  private void sum(int[] members, int n) {
    double[] aRe = re(members[0]);
    double[] aIm = im(members[0]);
    double[] bRe = re(members[1]);
    double[] bIm = im(members[1]);
    if (members.length == 2) {
      Kernels.sum(sumRe, aRe, bRe, n);
      Kernels.sum(sumIm, aIm, bIm, n);
      return;
    }
    Kernels.sum(sumRe, aRe, bRe, re(members[2]), n);
    Kernels.sum(sumIm, aIm, bIm, im(members[2]), n);
    for (int i = 3; i < members.length; i++) {
      Kernels.add(sumRe, re(members[i]), n);
      Kernels.add(sumIm, im(members[i]), n);
    }
  }

  /** Adds what the star leaves between its neighbours; all members but the last become shares. */
  private void spread(int[] members, int[] targets, int n) {
    int pair = 0;
    for (int i = 0; i < members.length - 1; i++) {
      share(members[i], n);
      double[] shareRe = re(members[i]);
      double[] shareIm = im(members[i]);
      for (int j = i + 1; j < members.length; j++) {
        double[] otherRe = re(members[j]);
        double[] otherIm = im(members[j]);
        int to = targets[pair++];
        if (to >= 0) {
          Kernels.addProduct(re(to), im(to), shareRe, shareIm, otherRe, otherIm, n);
        } else {
          Kernels.product(re(~to), im(~to), shareRe, shareIm, otherRe, otherIm, n);
        }
      }
    }
  }

  private void share(int member, int n) {
    double[] shareRe = re(member);
    double[] shareIm = im(member);
    Kernels.product(shareRe, shareIm, shareRe, shareIm, sumRe, sumIm, n);
  }

  /** All shares but the last, which is 1 less the others. */
  private void watch(int[] members, double[] largestShare, int n) {
    for (int i = 0; i < members.length - 1; i++) {
      Kernels.largestSquare(largestShare, re(members[i]), im(members[i]), n);
    }
  }

  double[] re(int branch) {
    return re[storage.room[branch]];
  }

  double[] im(int branch) {
    return im[storage.room[branch]];
  }

  /** The rounding of the additions that have made a branch that is left, in units of 2⁻⁵³. */
  double rounding(int branch) {
    return elimination.additions(branch);
  }

  NodeBlock node(int node) {
    return nodes[node];
  }

  /**
   * Finds the voltages of the eliminated nodes from those of the kept ones, and adds what the
   * roundings of all eliminations do to the port's admittance.
   */
  void trace(Powers to, int n) {
    Elimination.Star[] stars = elimination.stars();
    for (int k = stars.length - 1; k >= 0; k--) {
      NodeBlock own = nodes[stars[k].node];
      own.clear(n);
      int[] members = stars[k].members;
      int[] neighbours = stars[k].neighbours;
      Arrays.fill(growth, 0, n, 0);
      for (int i = 0; i < members.length; i++) {
        own.addShare(re(members[i]), im(members[i]), nodes[neighbours[i]], n);
        Kernels.addSize(growth, re(members[i]), im(members[i]), n);
      }
      own.finish(n);
      Kernels.multiply(growth, pivot[k], n);
      for (int i = 0; i < members.length; i++) {
        double rounding = FILL + members.length + stars[k].additions[i];
        Kernels.weigh(weight, growth, rounding, re(members[i]), im(members[i]), n);
        to.add(weight, own, nodes[neighbours[i]], n);
      }
    }
  }
}
