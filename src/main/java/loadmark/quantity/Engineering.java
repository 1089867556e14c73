package loadmark.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Values as engineers write them: an SI prefix, a unit, so many significant digits. Stand-in. */
public final class Engineering {
  private static final String[] PREFIXES = {"f", "p", "n", "µ", "m", "", "k", "M", "G", "T"};
  private static final int FIRST = -15;

  private Engineering() {}

  /** With exactly {@code digits} significant digits. */
  public static String format(double value, String unit, int digits) {
    return write(value, unit, digits, false);
  }

  /** With at most {@code digits} significant digits, zeros at the end dropped. */
  public static String formatShort(double value, String unit, int digits) {
    return write(value, unit, digits, true);
  }

  private static String write(double value, String unit, int digits, boolean strip) {
    if (value == 0) {
      return "0 " + unit;
    }
    MathContext to = new MathContext(digits, RoundingMode.HALF_EVEN);
    BigDecimal rounded = new BigDecimal(Double.toString(value)).round(to);
    int exponent = rounded.precision() - rounded.scale() - 1;
    int power = Math.floorDiv(exponent, 3) * 3;
    int index = Math.max(0, Math.min(PREFIXES.length - 1, (power - FIRST) / 3));
    BigDecimal shown = rounded.movePointLeft(FIRST + 3 * index);
    shown =
        strip
            ? shown.stripTrailingZeros()
            : shown.setScale(
                Math.max(0, shown.scale() + digits - shown.precision()), RoundingMode.UNNECESSARY);
    return shown.toPlainString().replace('-', '−') + " " + PREFIXES[index] + unit;
  }
}
