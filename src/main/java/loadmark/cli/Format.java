package loadmark.cli;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** How results are written. */
enum Format {
  TEXT("text"),
  JSON("json"),
  CSV("csv"),
  S1P("s1p");

  private final String word;

  Format(String word) {
    this.word = word;
  }

  static Optional<Format> find(String word) {
    return Arrays.stream(values()).filter(f -> f.word.equals(word)).findFirst();
  }

  String word() {
    return word;
  }

  /** Those that a command has. */
  static List<String> words(String command) {
    return Arrays.stream(values()).filter(f -> f.isOf(command)).map(f -> f.word).toList();
  }

  boolean isOf(String command) {
    return this != S1P || command.equals(Options.CURVE);
  }
}
