package loadmark.solve;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Arithmetic on {@link Tracked} numbers of one block, in arrays that are used again for the next
 * block. {@code null} is a structural zero. A workspace: not shared between threads.
 */
final class Algebra {
  /** Rounding of a complex product, in units of 2⁻⁵³; at least √5. */
  private static final double PRODUCT = 3;

  /** Rounding of a complex quotient. */
  private static final double QUOTIENT = 8;

  private final int size;
  private final boolean tracks;
  private final Tracked one;
  private final double[] part;
  private final List<Tracked> pool = new ArrayList<>();
  private int used;
  private int n;

  /**
   * For blocks of up to {@code size} frequencies.
   *
   * @param tracks whether the errors are worked out
   */
  Algebra(int size, boolean tracks) {
    this.size = size;
    this.tracks = tracks;
    one = new Tracked(size);
    one.set(1);
    part = new double[size];
  }

  /** Begins a block with n frequencies: all earlier results are void. */
  void begin(int frequencies) {
    n = frequencies;
    used = 0;
  }

  Tracked one() {
    return one;
  }

  /** A number whose value is yet to be written, with this error. */
  Tracked take(double error) {
    Tracked taken = takeUnset();
    if (tracks) {
      Arrays.fill(taken.error, 0, n, error);
    }
    return taken;
  }

  /** A view of others' arrays, with this error. */
  Tracked view(double[] re, double[] im, double error) {
    Tracked taken = take(error);
    return new Tracked(re, im, taken.error);
  }

  private Tracked takeUnset() {
    if (used == pool.size()) {
      pool.add(new Tracked(size));
    }
    return pool.get(used++);
  }

  @Nullable Tracked plus(@Nullable Tracked a, @Nullable Tracked b) {
    if (a == null || b == null) {
      return a == null ? b : a;
    }
    Tracked sum = takeUnset();
    Kernels.sum(sum.re, a.re, b.re, n);
    Kernels.sum(sum.im, a.im, b.im, n);
    trackSum(sum, a, b);
    return sum;
  }

  @Nullable Tracked minus(@Nullable Tracked a, @Nullable Tracked b) {
    if (b == null) {
      return a;
    }
    Tracked difference = takeUnset();
    if (a == null) {
      for (int i = 0; i < n; i++) {
        difference.re[i] = -b.re[i];
        difference.im[i] = -b.im[i];
      }
      System.arraycopy(b.error, 0, difference.error, 0, n);
      return difference;
    }
    Kernels.difference(difference.re, a.re, b.re, n);
    Kernels.difference(difference.im, a.im, b.im, n);
    trackSum(difference, a, b);
    return difference;
  }

  private void trackSum(Tracked sum, Tracked a, Tracked b) {
    if (tracks) {
      Kernels.absolute(sum.error, a.error, a.re, a.im, n);
      Kernels.absolute(part, b.error, b.re, b.im, n);
      Kernels.add(sum.error, part, n);
      Kernels.relative(sum.error, sum.re, sum.im, n);
    }
  }

  @Nullable Tracked times(@Nullable Tracked a, @Nullable Tracked b) {
    if (a == null || b == null) {
      return null;
    }
    if (a == one || b == one) {
      return a == one ? b : a;
    }
    Tracked product = takeUnset();
    Kernels.product(product.re, product.im, a.re, a.im, b.re, b.im, n);
    if (tracks) {
      Kernels.combine(product.error, PRODUCT, 1, a.error, 1, b.error, n);
    }
    return product;
  }

  @Nullable Tracked over(@Nullable Tracked a, Tracked b) {
    if (a == null || b == one) {
      return a;
    }
    Tracked quotient = takeUnset();
    if (a == one) {
      Kernels.inverse(quotient.re, quotient.im, b.re, b.im, n);
    } else {
      Kernels.quotient(quotient.re, quotient.im, a.re, a.im, b.re, b.im, n);
    }
    if (tracks) {
      Kernels.combine(quotient.error, QUOTIENT, 1, a.error, 1, b.error, n);
    }
    return quotient;
  }
}
