package loadmark.report;

import com.fasterxml.jackson.core.io.NumberOutput;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.quantity.Engineering;

/** How a limit's values are written for people. */
enum Unit {
  RATIO,
  OHM,
  FARAD,
  DEGREE,
  DECIBEL;

  /** As many digits as a value shows where no bound asks for more. */
  static final int DIGITS = 4;

  /** As many digits as a bound shows at most: rounding of unit conversions stays hidden. */
  private static final int BOUND_DIGITS = 12;

  /** Plain numbers outside 1e-5 to 1e7 are written with an exponent. */
  private static final int LEAST_PLAIN = -5;

  private static final int MOST_PLAIN = 6;

  /** The unit of {@link loadmark.judge.Worst#value()}, or that of the only bound in Ω. */
  static Unit of(Limit limit) {
    return inOhmAlone(limit) ? OHM : of(limit.criterion());
  }

  static boolean inOhmAlone(Limit limit) {
    return limit.bound().atMostOhm().isPresent() && limit.bound().atMost().isEmpty();
  }

  private static Unit of(Criterion criterion) {
    return switch (criterion) {
      case CHANGE, MAGNITUDE_CHANGE, MAGNITUDE_WITHIN -> RATIO;
      case PHASE_CHANGE, PHASE, PHASE_WITHIN -> DEGREE;
      case MAGNITUDE, PARALLEL_RESISTANCE -> OHM;
      case PARALLEL_CAPACITANCE -> FARAD;
      case RETURN_LOSS -> DECIBEL;
    };
  }

  /** With exactly {@code digits} significant digits. */
  String write(double value, int digits) {
    return switch (this) {
      case OHM -> Engineering.format(value, "Ω", digits);
      case FARAD -> Engineering.format(value, "F", digits);
      case RATIO -> plain(decimal(value).movePointRight(2), digits) + " %";
      case DEGREE -> plain(decimal(value), digits) + "°";
      case DECIBEL -> plain(decimal(value), digits) + " dB";
    };
  }

  /** As short as the user would write it. */
  String writeBound(double bound) {
    return switch (this) {
      case OHM -> Engineering.formatShort(bound, "Ω", BOUND_DIGITS);
      case FARAD -> Engineering.formatShort(bound, "F", BOUND_DIGITS);
      case RATIO -> stripped(decimal(bound).movePointRight(2)) + " %";
      case DEGREE -> stripped(decimal(bound)) + "°";
      case DECIBEL -> stripped(decimal(bound)) + " dB";
    };
  }

  /** The shortest decimal that reads back {@code value}. */
  static BigDecimal decimal(double value) {
    return new BigDecimal(NumberOutput.toString(value, true));
  }

  static BigDecimal rounded(BigDecimal value, int digits) {
    return value.round(new MathContext(digits, RoundingMode.HALF_EVEN));
  }

  private static String plain(BigDecimal value, int digits) {
    if (value.signum() == 0) {
      return "0";
    }
    BigDecimal rounded = rounded(value, digits);
    BigDecimal full =
        rounded.setScale(rounded.scale() + digits - rounded.precision(), RoundingMode.UNNECESSARY);
    return text(full);
  }

  private static String stripped(BigDecimal value) {
    return text(rounded(value, BOUND_DIGITS).stripTrailingZeros());
  }

  private static String text(BigDecimal value) {
    int exponent = value.precision() - value.scale() - 1;
    boolean plain = LEAST_PLAIN <= exponent && exponent <= MOST_PLAIN;
    String text =
        plain || value.signum() == 0
            ? value.toPlainString()
            : new BigDecimal(value.unscaledValue(), value.precision() - 1).toPlainString()
                + "e"
                + exponent;
    return text.replace('-', '−');
  }
}
