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
  void set(@Nullable Tracked without, @Nullable Tracked with, @Nullable Tracked change, int n) {
    set(re, im, without, n);
    set(withRe, withIm, with, n);
    set(changeRe, changeIm, change, n);
  }

  private static void set(double[] re, double[] im, @Nullable Tracked to, int n) {
    if (to == null) {
      Arrays.fill(re, 0, n, 0);
      Arrays.fill(im, 0, n, 0);
    } else {
      System.arraycopy(to.re, 0, re, 0, n);
      System.arraycopy(to.im, 0, im, 0, n);
    }
  }

  /** Goes on from one change to the next: the voltage with the loads is that of the last. */
  void append(NodeBlock next, int n) {
    System.arraycopy(next.withRe, 0, withRe, 0, n);
    System.arraycopy(next.withIm, 0, withIm, 0, n);
    Kernels.add(changeRe, next.changeRe, n);
    Kernels.add(changeIm, next.changeIm, n);
  }

  void copy(NodeBlock other, int n) {
    System.arraycopy(other.re, 0, re, 0, n);
    System.arraycopy(other.im, 0, im, 0, n);
    System.arraycopy(other.withRe, 0, withRe, 0, n);
    System.arraycopy(other.withIm, 0, withIm, 0, n);
    System.arraycopy(other.changeRe, 0, changeRe, 0, n);
    System.arraycopy(other.changeIm, 0, changeIm, 0, n);
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
