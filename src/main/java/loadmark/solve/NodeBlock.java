package loadmark.solve;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * The voltage of a node at each frequency of a block, one volt being at the port: without the
 * loads, with them, and what they change. Only error estimates rest on it.
 */
final class NodeBlock {
  final double[] re;
  final double[] im;
  final double[] withRe;
  final double[] withIm;
  final double[] changeRe;
  final double[] changeIm;

  NodeBlock(int size) {
    re = new double[size];
    im = new double[size];
    withRe = new double[size];
    withIm = new double[size];
    changeRe = new double[size];
    changeIm = new double[size];
  }

  void clear(int n) {
    set(0, n);
  }

  /** The same with and without the loads. */
  void set(double volts, int n) {
    Arrays.fill(re, 0, n, volts);
    Arrays.fill(im, 0, n, 0);
    Arrays.fill(withRe, 0, n, volts);
    Arrays.fill(withIm, 0, n, 0);
    Arrays.fill(changeRe, 0, n, 0);
    Arrays.fill(changeIm, 0, n, 0);
  }

  /** {@code null} is zero. */
  void set(@Nullable Tracked without, @Nullable Tracked with, int n) {
    clear(n);
    if (without != null) {
      System.arraycopy(without.re, 0, re, 0, n);
      System.arraycopy(without.im, 0, im, 0, n);
    }
    if (with != null) {
      System.arraycopy(with.re, 0, withRe, 0, n);
      System.arraycopy(with.im, 0, withIm, 0, n);
    }
    Kernels.difference(changeRe, withRe, re, n);
    Kernels.difference(changeIm, withIm, im, n);
  }

  /** Without the loads as at one node, with them as at another. */
  void set(NodeBlock without, NodeBlock with, int n) {
    System.arraycopy(without.re, 0, re, 0, n);
    System.arraycopy(without.im, 0, im, 0, n);
    System.arraycopy(with.withRe, 0, withRe, 0, n);
    System.arraycopy(with.withIm, 0, withIm, 0, n);
    Kernels.difference(changeRe, withRe, re, n);
    Kernels.difference(changeIm, withIm, im, n);
  }

  /** Adds a neighbour's voltage by its share of the star. */
  void addShare(double[] shareRe, double[] shareIm, NodeBlock of, int n) {
    Kernels.addProduct(re, im, shareRe, shareIm, of.re, of.im, n);
    Kernels.addProduct(changeRe, changeIm, shareRe, shareIm, of.changeRe, of.changeIm, n);
  }

  /** Ends a row of {@link #addShare}. */
  void finish(int n) {
    Kernels.sum(withRe, re, changeRe, n);
    Kernels.sum(withIm, im, changeIm, n);
  }
}
