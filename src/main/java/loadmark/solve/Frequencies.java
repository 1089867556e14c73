package loadmark.solve;

import org.jspecify.annotations.Nullable;

/** Complex frequencies s, rad/s. Immutable. */
public final class Frequencies {
  /** 2π is their sum, to 32 digits. */
  private static final double TWO_PI = 2 * Math.PI;

  private static final double TWO_PI_REST = 2.4492935982947064e-16;

  private final double[] re;
  private final double[] im;
  private final double @Nullable [] hz;
  private final boolean onAxis;

  private Frequencies(double[] re, double[] im, double @Nullable [] hz, boolean onAxis) {
    this.re = re;
    this.im = im;
    this.hz = hz;
    this.onAxis = onAxis;
  }

  /** s = j2πf. */
  public static Frequencies ofHz(double... hz) {
    double[] im = new double[hz.length];
    for (int i = 0; i < hz.length; i++) {
      im[i] = TWO_PI * hz[i];
    }
    return new Frequencies(new double[hz.length], im, hz.clone(), true);
  }

  /** Anywhere in the plane but at 0. */
  public static Frequencies ofS(double[] re, double[] im) {
    if (re.length != im.length) {
      throw new IllegalArgumentException(re.length + " real parts, " + im.length + " imaginary");
    }
    boolean onAxis = true;
    for (double x : re) {
      onAxis &= x == 0;
    }
    return new Frequencies(re.clone(), im.clone(), null, onAxis);
  }

  public int size() {
    return re.length;
  }

  /** Whether all are imaginary. */
  boolean areOnAxis() {
    return onAxis;
  }

  /** Real parts; not modified. */
  double[] re() {
    return re;
  }

  /** Imaginary parts; not modified. */
  double[] im() {
    return im;
  }

  /** What the imaginary part has lost in rounding. */
  double low(int i) {
    return hz == null ? 0 : Math.fma(TWO_PI, hz[i], -im[i]) + TWO_PI_REST * hz[i];
  }
}
