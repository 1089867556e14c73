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

  /** {@code 12.34 kΩ ∠ -45.21°}. */
  static String polar(Ohms z) {
    return switch (z.state()) {
      case OPEN -> "open";
      case UNDETERMINED -> "undetermined";
      case FINITE -> z.isZero() ? "0 Ω" : Unit.OHM.write(z.magnitude()) + " ∠ " + phase(z);
    };
  }

  /** {@code 8.694 kΩ - j8.757 kΩ}; empty where there is nothing to add. */
  static String rectangular(Ohms z) {
    if (!z.isFinite() || z.isZero()) {
      return "";
    }
    String sign = z.im() < 0 ? " - j" : " + j";
    return Unit.OHM.write(z.re()) + sign + Unit.OHM.write(Math.abs(z.im()));
  }

  /** Four significant digits, at most four decimals. */
  static String phase(Ohms z) {
    BigDecimal exact = Unit.decimal(z.phaseDegrees());
    BigDecimal degrees = Unit.rounded(exact, Engineering.DEFAULT_DIGITS);
    int integerDigits = degrees.precision() - degrees.scale();
    int decimals =
        Math.max(0, Math.min(PHASE_DECIMALS, Engineering.DEFAULT_DIGITS - integerDigits));
    BigDecimal shown = degrees.setScale(decimals, RoundingMode.HALF_EVEN);
    return shown.signum() == 0 ? "0°" : shown.toPlainString() + "°";
  }

  /** {@code 31.62 kHz}, {@code DC}. */
  static String frequency(double hz) {
    return frequency(hz, Engineering.DEFAULT_DIGITS);
  }

  private static String frequency(double hz, int digits) {
    return hz == 0 ? "DC" : Unit.HERTZ.writeShort(hz, digits);
  }

  /** {@code 10 Hz to 1 MHz}, with the digits that tell its ends apart. */
  static String band(Band band) {
    if (band.isPoint()) {
      return frequency(band.fromHz());
    }
    int digits = Engineering.DEFAULT_DIGITS;
    while (digits < MOST_DIGITS
        && frequency(band.fromHz(), digits).equals(frequency(band.toHz(), digits))) {
      digits++;
    }
    return frequency(band.fromHz(), digits) + " to " + frequency(band.toHz(), digits);
  }
}
