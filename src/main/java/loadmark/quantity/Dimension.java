package loadmark.quantity;

import java.util.List;
import java.util.Optional;

/**
 * The physical dimension of a value: exponents of the SI base units it needs, and three kinds that
 * arithmetic keeps apart from plain numbers although SI does not (angle, level in decibels,
 * converter codes).
 */
public record Dimension(
    int metre, int kilogram, int second, int ampere, int angle, int level, int code) {

  public static final Dimension NUMBER = si(0, 0, 0, 0);
  public static final Dimension RESISTANCE = si(2, 1, -3, -2);
  public static final Dimension CONDUCTANCE = NUMBER.over(RESISTANCE);
  public static final Dimension TIME = si(0, 0, 1, 0);
  public static final Dimension FREQUENCY = NUMBER.over(TIME);
  public static final Dimension CAPACITANCE = TIME.over(RESISTANCE);
  public static final Dimension INDUCTANCE = TIME.times(RESISTANCE);
  public static final Dimension LENGTH = si(1, 0, 0, 0);
  public static final Dimension CURRENT = si(0, 0, 0, 1);
  public static final Dimension VOLTAGE = RESISTANCE.times(CURRENT);
  public static final Dimension POWER = VOLTAGE.times(CURRENT);
  public static final Dimension SPEED = LENGTH.over(TIME);
  public static final Dimension ANGLE = new Dimension(0, 0, 0, 0, 1, 0, 0);
  public static final Dimension LEVEL = new Dimension(0, 0, 0, 0, 0, 1, 0);
  public static final Dimension CODE = new Dimension(0, 0, 0, 0, 0, 0, 1);

  private static Dimension si(int metre, int kilogram, int second, int ampere) {
    return new Dimension(metre, kilogram, second, ampere, 0, 0, 0);
  }

  public Dimension times(Dimension other) {
    return new Dimension(
        metre + other.metre,
        kilogram + other.kilogram,
        second + other.second,
        ampere + other.ampere,
        angle + other.angle,
        level + other.level,
        code + other.code);
  }

  public Dimension over(Dimension other) {
    return times(other.power(-1));
  }

  public Dimension power(int n) {
    return new Dimension(
        metre * n, kilogram * n, second * n, ampere * n, angle * n, level * n, code * n);
  }

  /** The dimension whose square this is, where there is one. */
  public Optional<Dimension> findRoot() {
    boolean even = (metre | kilogram | second | ampere | angle | level | code) % 2 == 0;
    return even
        ? Optional.of(
            new Dimension(
                metre / 2, kilogram / 2, second / 2, ampere / 2, angle / 2, level / 2, code / 2))
        : Optional.empty();
  }

  /** In words, for messages: {@code a resistance (Ω)}, {@code a plain number}. */
  public String describe() {
    for (Named named : NAMED) {
      if (named.dimension.equals(this)) {
        return named.words;
      }
    }
    return "a value in " + inBaseUnits();
  }

  private record Named(Dimension dimension, String words) {}

  private static final List<Named> NAMED =
      List.of(
          new Named(NUMBER, "a plain number"),
          new Named(RESISTANCE, "a resistance (Ω)"),
          new Named(CONDUCTANCE, "a conductance (S)"),
          new Named(CAPACITANCE, "a capacitance (F)"),
          new Named(INDUCTANCE, "an inductance (H)"),
          new Named(FREQUENCY, "a frequency (Hz)"),
          new Named(TIME, "a time (s)"),
          new Named(LENGTH, "a length (m)"),
          new Named(SPEED, "a speed (m/s)"),
          new Named(VOLTAGE, "a voltage (V)"),
          new Named(CURRENT, "a current (A)"),
          new Named(POWER, "a power (W)"),
          new Named(ANGLE, "an angle (deg)"),
          new Named(LEVEL, "a value in dB"),
          new Named(CODE, "a number of converter codes (lsb)"));

  private String inBaseUnits() {
    StringBuilder units = new StringBuilder();
    append(units, "kg", kilogram);
    append(units, "m", metre);
    append(units, "s", second);
    append(units, "A", ampere);
    append(units, "deg", angle);
    append(units, "dB", level);
    append(units, "lsb", code);
    return units.toString();
  }

  private static void append(StringBuilder units, String unit, int exponent) {
    if (exponent != 0) {
      units.append(units.isEmpty() ? "" : "·").append(unit);
      units.append(exponent == 1 ? "" : "^" + exponent);
    }
  }
}
