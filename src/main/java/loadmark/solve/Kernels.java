package loadmark.solve;

/**
 * Loops over the frequencies of a block. Each is short, reads what it needs before it writes, and
 * runs over few plain arrays: that is what the compiler vectorizes.
 */
final class Kernels {
  private Kernels() {}

  static void add(double[] to, double[] a, int n) {
    for (int i = 0; i < n; i++) {
      to[i] += a[i];
    }
  }

  static void subtract(double[] to, double[] a, int n) {
    for (int i = 0; i < n; i++) {
      to[i] -= a[i];
    }
  }

  static void scale(double[] to, double by, int n) {
    for (int i = 0; i < n; i++) {
      to[i] *= by;
    }
  }

  static void multiply(double[] to, double[] by, int n) {
    for (int i = 0; i < n; i++) {
      to[i] *= by[i];
    }
  }

  /** to = a + b. */
  static void sum(double[] to, double[] a, double[] b, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = a[i] + b[i];
    }
  }

  /** to = a + b + c. */
  static void sum(double[] to, double[] a, double[] b, double[] c, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = a[i] + b[i] + c[i];
    }
  }

  /** to = a − b. */
  static void difference(double[] to, double[] a, double[] b, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = a[i] - b[i];
    }
  }

  /** to = constant + times·a + over·b. */
  static void combine(
      double[] to, double constant, double times, double[] a, double over, double[] b, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = constant + times * a[i] + over * b[i];
    }
  }

  /** 1/(re + j·im). */
  static void inverse(double[] toRe, double[] toIm, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      double x = re[i];
      double y = im[i];
      double inverse = 1 / (x * x + y * y);
      toRe[i] = x * inverse;
      toIm[i] = -y * inverse;
    }
  }

  /** to += 1/(re + j·im). */
  static void addInverse(double[] toRe, double[] toIm, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      double x = re[i];
      double y = im[i];
      double inverse = 1 / (x * x + y * y);
      toRe[i] += x * inverse;
      toIm[i] -= y * inverse;
    }
  }

  /** to = a·b. */
  static void product(
      double[] toRe, double[] toIm, double[] aRe, double[] aIm, double[] bRe, double[] bIm, int n) {
    for (int i = 0; i < n; i++) {
      double a = aRe[i];
      double b = aIm[i];
      double c = bRe[i];
      double d = bIm[i];
      toRe[i] = a * c - b * d;
      toIm[i] = a * d + b * c;
    }
  }

  /** to += a·b. */
  static void addProduct(
      double[] toRe, double[] toIm, double[] aRe, double[] aIm, double[] bRe, double[] bIm, int n) {
    for (int i = 0; i < n; i++) {
      double a = aRe[i];
      double b = aIm[i];
      double c = bRe[i];
      double d = bIm[i];
      toRe[i] = toRe[i] + (a * c - b * d);
      toIm[i] = toIm[i] + (a * d + b * c);
    }
  }

  /** to = a/b. */
  static void quotient(
      double[] toRe, double[] toIm, double[] aRe, double[] aIm, double[] bRe, double[] bIm, int n) {
    for (int i = 0; i < n; i++) {
      double a = aRe[i];
      double b = aIm[i];
      double c = bRe[i];
      double d = bIm[i];
      double inverse = 1 / (c * c + d * d);
      toRe[i] = (a * c + b * d) * inverse;
      toIm[i] = (b * c - a * d) * inverse;
    }
  }

  /** to = max(to, |z|²). */
  static void largestSquare(double[] to, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = Math.max(to[i], re[i] * re[i] + im[i] * im[i]);
    }
  }

  /** to = |re| + |im|. */
  static void size(double[] to, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = Math.abs(re[i]) + Math.abs(im[i]);
    }
  }

  /** to += |re| + |im|. */
  static void addSize(double[] to, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] += Math.abs(re[i]) + Math.abs(im[i]);
    }
  }

  /** to = by·constant·(|re| + |im|). */
  static void weigh(double[] to, double[] by, double constant, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = by[i] * constant * (Math.abs(re[i]) + Math.abs(im[i]));
    }
  }

  /** to = |a − b|². */
  static void distanceSquare(
      double[] to, double[] aRe, double[] aIm, double[] bRe, double[] bIm, int n) {
    for (int i = 0; i < n; i++) {
      double x = aRe[i] - bRe[i];
      double y = aIm[i] - bIm[i];
      to[i] = x * x + y * y;
    }
  }

  /** to += a·b. */
  static void addProduct(double[] to, double[] a, double[] b, int n) {
    for (int i = 0; i < n; i++) {
      to[i] += a[i] * b[i];
    }
  }

  /** to += weight·√(2c(a + b)), which is at least weight·√c·(√a + √b). */
  static void addMixed(double[] to, double[] weight, double[] a, double[] b, double[] c, int n) {
    for (int i = 0; i < n; i++) {
      to[i] += weight[i] * Math.sqrt(2 * c[i] * (a[i] + b[i]));
    }
  }

  /** to = error·(|re| + |im|). */
  static void absolute(double[] to, double[] error, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = error[i] * (Math.abs(re[i]) + Math.abs(im[i]));
    }
  }

  /** to = 1.5·to/(|re| + |im|) + 1, more than to/|z| + 1; of nothing in nothing, 1. */
  static void relative(double[] to, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = 1.5 * to[i] / (Math.abs(re[i]) + Math.abs(im[i]) + Double.MIN_NORMAL) + 1;
    }
  }

  /** to = √(re² + im²). */
  static void modulus(double[] to, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = Math.sqrt(re[i] * re[i] + im[i] * im[i]);
    }
  }

  /** to /= re² + im². */
  static void divideBySquare(double[] to, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = to[i] / (re[i] * re[i] + im[i] * im[i]);
    }
  }

  /** to = 1/a. */
  static void reciprocal(double[] to, double[] a, int n) {
    for (int i = 0; i < n; i++) {
      to[i] = 1 / a[i];
    }
  }
}
