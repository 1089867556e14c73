package loadmark.binding;

import java.util.List;
import loadmark.quantity.Dimension;

/**
 * What a statement asks for in the place of a value.
 *
 * @param noun for messages: {@code a resistance}
 * @param example for hints: {@code 10 kΩ}
 * @param unit what a single literal without a unit is taken in; empty where the unit must stand
 */
record Expected(Dimension dimension, String noun, String example, String unit, Range range) {

  /** Which values are allowed; infinite ones never are. */
  enum Range {
    POSITIVE,
    NOT_NEGATIVE,
    ANY
  }

  static final Expected RESISTANCE =
      new Expected(Dimension.RESISTANCE, "a resistance", "10 kΩ", "Ω", Range.POSITIVE);
  static final Expected RESISTANCE_OR_LINK = RESISTANCE.in(Range.NOT_NEGATIVE);
  static final Expected CAPACITANCE =
      new Expected(Dimension.CAPACITANCE, "a capacitance", "100 nF", "F", Range.POSITIVE);
  static final Expected INDUCTANCE =
      new Expected(Dimension.INDUCTANCE, "an inductance", "10 µH", "H", Range.POSITIVE);
  static final Expected FREQUENCY =
      new Expected(Dimension.FREQUENCY, "a frequency", "10 kHz", "Hz", Range.POSITIVE);
  static final Expected VOLTAGE =
      new Expected(Dimension.VOLTAGE, "a voltage", "3.3 V", "V", Range.ANY);
  static final Expected POSITIVE_VOLTAGE = VOLTAGE.in(Range.POSITIVE);
  static final Expected POWER =
      new Expected(Dimension.POWER, "a power", "0.1 W", "W", Range.POSITIVE);
  static final Expected RATIO =
      new Expected(Dimension.NUMBER, "a ratio", "2 %", "", Range.POSITIVE);
  static final Expected ANGLE =
      new Expected(Dimension.ANGLE, "an angle", "10 deg", "", Range.POSITIVE);
  static final Expected DECIBELS =
      new Expected(Dimension.LEVEL, "a value in dB", "20 dB", "", Range.POSITIVE);
  static final Expected COUNT =
      new Expected(Dimension.NUMBER, "a number", "50", "1", Range.POSITIVE);

  Expected in(Range other) {
    return new Expected(dimension, noun, example, unit, other);
  }

  boolean takesBareNumber() {
    return !unit.isEmpty();
  }

  /** {@code a ratio, such as 2 %, or a resistance, such as 10 kΩ}. */
  static String words(List<Expected> choices) {
    StringBuilder words = new StringBuilder();
    for (Expected choice : choices) {
      words.append(words.isEmpty() ? "" : " or ").append(choice.noun);
      words.append(" such as ").append(choice.example);
    }
    return words.toString();
  }
}
