package loadmark.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loadmark.equation.Law;

/**
 * The laws of two-terminals at each frequency of a block, and how they depend on their elements. A
 * workspace: not shared between threads.
 */
final class LawBlock {
  /** Beyond these sizes a product of a few could leave the range of a double. */
  private static final double SMALLEST = 0x1p-200;

  private static final double LARGEST = 0x1p200;

  private final int size;
  private final double[] sRe;
  private final double[] sIm;
  private final double[] sAbs;
  private final double[] inverseRe;
  private final double[] inverseIm;
  private final double[] inverseAbs;
  private final List<double[][]> scratch = new ArrayList<>();
  private int n;
  private boolean onAxis;
  private double least;
  private double most;
  private boolean inRange;

  LawBlock(int size) {
    this.size = size;
    sRe = new double[size];
    sIm = new double[size];
    sAbs = new double[size];
    inverseRe = new double[size];
    inverseIm = new double[size];
    inverseAbs = new double[size];
  }

  /** Begins a block with n frequencies, from one of them on. */
  void begin(Frequencies s, int from, int frequencies) {
    n = frequencies;
    inRange = true;
    onAxis = s.areOnAxis();
    System.arraycopy(s.re(), from, sRe, 0, n);
    System.arraycopy(s.im(), from, sIm, 0, n);
    Kernels.modulus(sAbs, sRe, sIm, n);
    Kernels.reciprocal(inverseAbs, sAbs, n);
    Kernels.inverse(inverseRe, inverseIm, sRe, sIm, n);
    least = sAbs[0];
    most = sAbs[0];
    for (int i = 1; i < n; i++) {
      double abs = sAbs[i];
      if (abs < least) {
        least = abs;
      }
      if (abs > most) {
        most = abs;
      }
    }
  }

  /** Whether every term of every law since the beginning was of a size that can be worked with. */
  boolean isInRange() {
    return inRange;
  }

  /** Writes the admittance of a law, S. */
  void admittance(Law.Sum law, double[] values, double[] re, double[] im) {
    sum(law, values, re, im, 0);
    if (law.isImpedance()) {
      Kernels.inverse(re, im, re, im, n);
    }
  }

  /** Writes the impedance of a law, Ω. */
  void impedance(Law.Sum law, double[] values, double[] re, double[] im) {
    sum(law, values, re, im, 0);
    if (!law.isImpedance()) {
      Kernels.inverse(re, im, re, im, n);
    }
  }

  private void sum(Law.Sum law, double[] values, double[] re, double[] im, int depth) {
    double constant = law.coefficient(0, values);
    double times = law.coefficient(1, values);
    double over = law.coefficient(-1, values);
    check(constant, constant);
    check(times * least, times * most);
    check(over / most, over / least);
    if (onAxis) {
      Arrays.fill(re, 0, n, constant);
    } else {
      Kernels.combine(re, constant, times, sRe, over, inverseRe, n);
    }
    if (times == 0 && over == 0) {
      Arrays.fill(im, 0, n, 0);
    } else {
      Kernels.combine(im, 0, times, sIm, over, inverseIm, n);
    }
    for (int i = 0; i < law.inners(); i++) {
      double[][] part = scratch(depth);
      sum(law.inner(i), values, part[0], part[1], depth + 1);
      Kernels.addInverse(re, im, part[0], part[1], n);
    }
  }

  private void check(double from, double to) {
    inRange &= from == 0 ? to == 0 : from >= SMALLEST && to <= LARGEST;
  }

  private double[][] scratch(int depth) {
    if (scratch.size() == depth) {
      scratch.add(new double[3][size]);
    }
    return scratch.get(depth);
  }

  /** Writes Σ |x·∂y/∂x| over the elements' values x, y being the law's admittance. */
  void admittanceSize(Law.Sum law, double[] values, double[] size) {
    sumSize(law, values, size, 0);
    if (law.isImpedance()) {
      double[][] part = scratch(0);
      sum(law, values, part[0], part[1], 1);
      Kernels.divideBySquare(size, part[0], part[1], n);
    }
  }

  /** The same for its impedance. */
  void impedanceSize(Law.Sum law, double[] values, double[] size) {
    sumSize(law, values, size, 0);
    if (!law.isImpedance()) {
      double[][] part = scratch(0);
      sum(law, values, part[0], part[1], 1);
      Kernels.divideBySquare(size, part[0], part[1], n);
    }
  }

  private void sumSize(Law.Sum law, double[] values, double[] size, int depth) {
    double constant = law.coefficient(0, values);
    double times = law.coefficient(1, values);
    double over = law.coefficient(-1, values);
    Kernels.combine(size, constant, times, sAbs, over, inverseAbs, n);
    for (int i = 0; i < law.inners(); i++) {
      double[][] part = scratch(depth);
      sum(law.inner(i), values, part[0], part[1], depth + 1);
      sumSize(law.inner(i), values, part[2], depth + 1);
      Kernels.divideBySquare(part[2], part[0], part[1], n);
      Kernels.add(size, part[2], n);
    }
  }
}
