package loadmark.report;

import loadmark.network.Case;
import loadmark.response.Change;
import loadmark.response.Loading;
import loadmark.response.Ohms;

/**
 * The columns of a curve after port and case. A value is infinite where it has no bound, and not a
 * number where there is none; both are turned into words or nothing before they leave this package.
 */
enum CurveColumn {
  HZ("hz"),
  RE_OHM("re_ohm"),
  IM_OHM("im_ohm"),
  MAGNITUDE_OHM("magnitude_ohm"),
  PHASE_DEG("phase_deg"),
  PARALLEL_OHM("parallel_ohm"),
  PARALLEL_F("parallel_f"),
  CHANGE("change");

  private final String heading;

  CurveColumn(String heading) {
    this.heading = heading;
  }

  String heading() {
    return heading;
  }

  /** In the unit that the heading names; the case without loads has a change of 0. */
  double of(Loading point, Case shown) {
    Ohms z = point.with();
    if (z.isUndetermined() && this != HZ) {
      return Double.NaN;
    }
    return switch (this) {
      case HZ -> point.hz();
      case RE_OHM -> z.isFinite() ? z.re() : Double.NaN;
      case IM_OHM -> z.isFinite() ? z.im() : Double.NaN;
      case MAGNITUDE_OHM -> z.magnitude();
      case PHASE_DEG -> z.isFinite() && !z.isZero() ? z.phaseDegrees() : Double.NaN;
      case PARALLEL_OHM -> parallelOhm(z);
      case PARALLEL_F -> parallelFarad(point);
      case CHANGE -> shown.isBare() ? 0 : change(point.change());
    };
  }

  /** 1/Re(1/Z), Ω. */
  static double parallelOhm(Ohms z) {
    return switch (z.state()) {
      case UNDETERMINED -> Double.NaN;
      case OPEN -> Double.POSITIVE_INFINITY;
      case FINITE -> {
        if (z.isZero()) {
          yield 0;
        }
        // |Z|²/Re Z, in an order that does not overflow early.
        yield z.re() == 0 ? Double.POSITIVE_INFINITY : z.re() + z.im() * (z.im() / z.re());
      }
    };
  }

  /** Im(1/Z)/ω, F. */
  static double parallelFarad(Loading point) {
    Ohms z = point.with();
    if (point.hz() == 0 || z.isUndetermined() || z.isZero()) {
      return Double.NaN;
    }
    if (z.isOpen() || z.im() == 0) {
      return 0;
    }
    double magnitude = z.magnitude();
    return -(z.im() / magnitude) / magnitude / (2 * Math.PI * point.hz());
  }

  private static double change(Change change) {
    return change.isUndetermined() ? Double.NaN : change.magnitude();
  }
}
