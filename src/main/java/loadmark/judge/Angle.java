package loadmark.judge;

import loadmark.response.Ohms;

/** Angles in degrees. */
final class Angle {
  private Angle() {}

  /** The same direction in (−180, 180]. */
  static double wrap(double degrees) {
    double turned = Math.IEEEremainder(degrees, 360);
    return turned == -180 ? 180 : turned;
  }

  /** Of {@code z} from {@code reference}, both finite and not 0, in (−180, 180]. */
  static double between(Ohms z, Ohms reference) {
    double a = z.magnitude();
    double b = reference.magnitude();
    double re = z.re() / a;
    double im = z.im() / a;
    double refRe = reference.re() / b;
    double refIm = reference.im() / b;
    return of(re * refRe + im * refIm, im * refRe - re * refIm);
  }

  static double of(double re, double im) {
    double degrees = Math.toDegrees(Math.atan2(im, re));
    return degrees == -180 ? 180 : degrees;
  }

  static boolean hasNone(Ohms z) {
    return !z.isFinite() || z.isZero();
  }
}
