package loadmark.touchstone;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The keywords of version 2.0. */
enum Keyword {
  VERSION("[Version]"),
  PORTS("[Number of Ports]"),
  ORDER("[Two-Port Data Order]"),
  FREQUENCIES("[Number of Frequencies]"),
  NOISE_FREQUENCIES("[Number of Noise Frequencies]"),
  REFERENCE("[Reference]"),
  MATRIX("[Matrix Format]"),
  MIXED_MODE("[Mixed-Mode Order]"),
  BEGIN_INFORMATION("[Begin Information]"),
  END_INFORMATION("[End Information]"),
  NETWORK_DATA("[Network Data]"),
  NOISE_DATA("[Noise Data]"),
  END("[End]");

  private final String word;

  Keyword(String word) {
    this.word = word;
  }

  /** In any case, with any blanks. */
  static Optional<Keyword> find(String word) {
    String plain = plain(word);
    return Arrays.stream(values()).filter(k -> plain(k.word).equals(plain)).findFirst();
  }

  private static String plain(String word) {
    return word.replaceAll("\\s+", " ")
        .replace("[ ", "[")
        .replace(" ]", "]")
        .toLowerCase(Locale.ROOT);
  }

  static List<String> words() {
    return Arrays.stream(values()).map(Keyword::word).toList();
  }

  String word() {
    return word;
  }

  /** As messages quote it. */
  String quoted() {
    return "`" + word + "`";
  }
}
