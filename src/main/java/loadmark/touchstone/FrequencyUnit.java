package loadmark.touchstone;

import java.util.Arrays;
import java.util.Optional;

/** The units that frequencies may be written in. */
enum FrequencyUnit {
  HZ("Hz", 0),
  KHZ("kHz", 3),
  MHZ("MHz", 6),
  GHZ("GHz", 9);

  private final String word;
  private final int exponent;

  FrequencyUnit(String word, int exponent) {
    this.word = word;
    this.exponent = exponent;
  }

  static Optional<FrequencyUnit> find(String word) {
    return Arrays.stream(values()).filter(u -> u.word.equalsIgnoreCase(word)).findFirst();
  }

  String word() {
    return word;
  }

  /** The power of ten that turns it into hertz. */
  int exponent() {
    return exponent;
  }
}
