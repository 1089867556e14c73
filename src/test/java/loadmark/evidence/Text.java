package loadmark.evidence;

import java.util.Locale;

/** Numbers as a network file writes them. */
final class Text {

  private Text() {}

  /** All digits of the double, so that the file holds exactly that value. */
  static String of(double value, String unit) {
    return Double.toString(value).toLowerCase(Locale.ROOT) + " " + unit;
  }

  static String ohm(double value) {
    return of(value, "Ω");
  }

  static String farad(double value) {
    return of(value, "F");
  }

  static String henry(double value) {
    return of(value, "H");
  }

  static String hertz(double value) {
    return of(value, "Hz");
  }
}
