package loadmark.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import loadmark.network.Band;
import loadmark.quantity.Engineering;
import loadmark.response.Ohms;

/** Impedances and frequencies, for people. */
final class Impedances {
  /** Phases show so many decimals at most: 0.0001° is below what any bench resolves. */
  private static final int PHASE_DECIMALS = 4;

  private static final int MOST_DIGITS = 17;

  private Impedances() {}

  /** {@code 12.34 kΩ ∠ −45.21°}. */
  static String polar(Ohms z) {
    return switch (z.state()) {
      case OPEN -> "open";
      case UNDETERMINED -> "undetermined";
      case FINITE ->
          z.isZero()
              ? "0 Ω"
              : Engineering.format(z.magnitude(), "Ω", Unit.DIGITS) + " ∠ " + phase(z);
    };
  }

  /** {@code 8.694 kΩ − j8.757 kΩ}; empty where there is nothing to add. */
  static String rectangular(Ohms z) {
    if (!z.isFinite() || z.isZero()) {
      return "";
    }
    return Engineering.format(z.re(), "Ω", Unit.DIGITS)
        + (z.im() < 0 ? " − j" : " + j")
        + Engineering.format(Math.abs(z.im()), "Ω", Unit.DIGITS);
  }

  /** Four significant digits, at most four decimals. */
  static String phase(Ohms z) {
    BigDecimal degrees = Unit.rounded(Unit.decimal(z.phaseDegrees()), Unit.DIGITS);
    if (degrees.scale() > PHASE_DECIMALS) {
      degrees = degrees.setScale(PHASE_DECIMALS, RoundingMode.HALF_EVEN);
    }
    if (degrees.signum() == 0) {
      return "0°";
    }
    int missing = Unit.DIGITS - degrees.precision();
    int scale = Math.max(0, Math.min(PHASE_DECIMALS, degrees.scale() + missing));
    return degrees.setScale(scale, RoundingMode.HALF_EVEN).toPlainString().replace('-', '−') + "°";
  }

  /** {@code 31.62 kHz}, {@code DC}. */
  static String frequency(double hz) {
    return frequency(hz, Unit.DIGITS);
  }

  private static String frequency(double hz, int digits) {
    return hz == 0 ? "DC" : Engineering.formatShort(hz, "Hz", digits);
  }

  /** {@code 10 Hz to 1 MHz}, with the digits that tell its ends apart. */
  static String band(Band band) {
    if (band.isPoint()) {
      return frequency(band.fromHz());
    }
    int digits = Unit.DIGITS;
    while (digits < MOST_DIGITS
        && frequency(band.fromHz(), digits).equals(frequency(band.toHz(), digits))) {
      digits++;
    }
    return frequency(band.fromHz(), digits) + " to " + frequency(band.toHz(), digits);
  }
}
