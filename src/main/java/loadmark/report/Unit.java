package loadmark.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.quantity.Engineering;

/** How values are written for people. */
enum Unit {
  RATIO,
  OHM,
  FARAD,
  HERTZ,
  DEGREE,
  DECIBEL;

  /** A bound shows so many digits at most: rounding of unit conversions stays hidden. */
  static final int MOST_BOUND_DIGITS = 6;

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

  /** With four significant digits. */
  String write(double value) {
    return write(value, Engineering.DEFAULT_DIGITS);
  }

  /** With exactly {@code digits} significant digits. */
  String write(double value, int digits) {
    return switch (this) {
      case OHM -> Engineering.result(value, "Ω", digits);
      case FARAD -> Engineering.result(value, "F", digits);
      case HERTZ -> Engineering.result(value, "Hz", digits);
      case RATIO -> Engineering.percent(value, digits);
      case DEGREE -> Engineering.degrees(value, digits);
      case DECIBEL -> Engineering.plain(value, "dB", digits);
    };
  }

  /** As short as a user would write it: at most {@code digits}, no zeros at the end. */
  String writeShort(double value, int digits) {
    BigDecimal rounded = rounded(decimal(value), digits).stripTrailingZeros();
    if (rounded.precision() > Engineering.DEFAULT_DIGITS) {
      return write(value, rounded.precision());
    }
    return switch (this) {
      case OHM -> Engineering.input(value, "Ω");
      case FARAD -> Engineering.input(value, "F");
      case HERTZ -> Engineering.input(value, "Hz");
      case RATIO -> Engineering.percent(value);
      case DEGREE -> Engineering.degrees(value);
      case DECIBEL -> Engineering.plain(value, "dB", Math.max(1, integerDigits(rounded)));
    };
  }

  /** Enough digits for the whole of a short decimal. */
  private static int integerDigits(BigDecimal value) {
    return Math.max(value.precision(), value.precision() - value.scale());
  }

  static BigDecimal decimal(double value) {
    return BigDecimal.valueOf(value);
  }

  static BigDecimal rounded(BigDecimal value, int digits) {
    return value.round(new MathContext(digits, RoundingMode.HALF_EVEN));
  }
}
