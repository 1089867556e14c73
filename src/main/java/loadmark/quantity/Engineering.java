package loadmark.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Writes values: for people with SI prefixes and few digits, for machines exactly. */
public final class Engineering {
  public static final int DEFAULT_DIGITS = 4;

  private static final String[] PREFIXES = {"f", "p", "n", "µ", "m", "", "k", "M", "G", "T"};
  private static final int LEAST_EXPONENT = -15;
  private static final int MOST_EXPONENT = 14;

  private Engineering() {}

  /** {@code 4.7 nF}: at most four digits, without zeros at the end; for what a user wrote. */
  public static String input(double value, String unit) {
    return prefixed(value, unit, DEFAULT_DIGITS, true);
  }

  /** {@code 4.700 nF}: four digits, zeros kept; for what was computed. */
  public static String result(double value, String unit) {
    return result(value, unit, DEFAULT_DIGITS);
  }

  /**
   * As many significant digits as asked for, zeros kept.
   *
   * @throws IllegalArgumentException for a value that is not a number
   */
  public static String result(double value, String unit, int digits) {
    return prefixed(value, unit, digits, false);
  }

  /**
   * Without a prefix, zeros kept: for decibels, degrees and plain numbers.
   *
   * @param unit may be empty
   */
  public static String plain(double value, String unit, int digits) {
    return join(digits(value, digits, false), "", unit);
  }

  /** {@code 2 %} for 0.02, without zeros at the end. */
  public static String percent(double ratio) {
    return join(digits(hundredfold(ratio), DEFAULT_DIGITS, true), "", "%");
  }

  /** {@code 1.234 %} for 0.01234, zeros kept. */
  public static String percent(double ratio, int digits) {
    return join(digits(hundredfold(ratio), digits, false), "", "%");
  }

  /** Degrees from degrees, without zeros at the end: {@code 11.5°}. */
  public static String degrees(double degrees) {
    return digits(degrees, DEFAULT_DIGITS, true) + "°";
  }

  /** Degrees from degrees, zeros kept. */
  public static String degrees(double degrees, int digits) {
    return digits(degrees, digits, false) + "°";
  }

  /**
   * The shortest decimal that reads back as the same double, the sign of zero aside: {@code 10},
   * {@code 0.02}, {@code 1e6}, {@code 4.7e-9}.
   *
   * @throws IllegalArgumentException for a value that is not finite
   */
  public static String exact(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("not finite: " + value);
    }
    if (value == 0) {
      return "0";
    }
    BigDecimal shortest = shortest(value).stripTrailingZeros();
    int exponent = exponent(shortest);
    return exponent < -4 || (exponent > 5 && shortest.scale() <= 0)
        ? scientific(shortest)
        : shortest.toPlainString();
  }

  /** Before Java 19 {@link Double#toString} may write a digit more than it needs. */
  private static BigDecimal shortest(double value) {
    BigDecimal best = new BigDecimal(Double.toString(value)).stripTrailingZeros();
    BigDecimal whole = new BigDecimal(value);
    while (best.precision() > 1) {
      BigDecimal shorter =
          whole.round(new MathContext(best.precision() - 1, RoundingMode.HALF_EVEN));
      if (shorter.doubleValue() != value) {
        return best;
      }
      best = shorter.stripTrailingZeros();
    }
    return best;
  }

  private static String prefixed(double value, String unit, int digits, boolean trimmed) {
    if (value == 0 || Double.isInfinite(value)) {
      return join(digits(value, digits, true), "", unit);
    }
    BigDecimal rounded = rounded(value, digits);
    int exponent = exponent(rounded);
    if (exponent < LEAST_EXPONENT || exponent > MOST_EXPONENT) {
      BigDecimal shown = trimmed ? rounded.stripTrailingZeros() : rounded;
      return join(scientific(shown), "", unit);
    }
    int step = Math.floorDiv(exponent, 3);
    BigDecimal mantissa = rounded.scaleByPowerOfTen(-3 * step);
    return join(written(mantissa, trimmed), PREFIXES[step - LEAST_EXPONENT / 3], unit);
  }

  private static String digits(double value, int digits, boolean trimmed) {
    if (Double.isNaN(value)) {
      throw new IllegalArgumentException("not a number");
    }
    if (Double.isInfinite(value)) {
      return value > 0 ? "∞" : "-∞";
    }
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded = rounded(value, digits);
    int exponent = exponent(rounded);
    return exponent < -4 || exponent > Math.max(digits, 6)
        ? scientific(trimmed ? rounded.stripTrailingZeros() : rounded)
        : written(rounded, trimmed);
  }

  /** Exactly so many significant digits. */
  private static BigDecimal rounded(double value, int digits) {
    if (Double.isNaN(value)) {
      throw new IllegalArgumentException("not a number");
    }
    BigDecimal rounded =
        BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
    return rounded.setScale(digits - 1 - exponent(rounded));
  }

  private static double hundredfold(double ratio) {
    return Double.isFinite(ratio)
        ? BigDecimal.valueOf(ratio).scaleByPowerOfTen(2).doubleValue()
        : ratio;
  }

  private static String written(BigDecimal value, boolean trimmed) {
    return (trimmed ? value.stripTrailingZeros() : value).toPlainString();
  }

  private static String scientific(BigDecimal value) {
    int exponent = exponent(value);
    return value.scaleByPowerOfTen(-exponent).toPlainString() + "e" + exponent;
  }

  /** The power of ten of the first digit. */
  private static int exponent(BigDecimal value) {
    return value.precision() - value.scale() - 1;
  }

  private static String join(String number, String prefix, String unit) {
    String word = prefix + unit;
    return word.isEmpty() ? number : number + " " + word;
  }
}
