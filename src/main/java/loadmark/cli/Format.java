package loadmark.cli;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** How results are written. */
enum Format {
  TEXT("text"),
  JSON("json"),
  CSV("csv");

  private final String word;

  Format(String word) {
    this.word = word;
  }

  static Optional<Format> find(String word) {
    return Arrays.stream(values()).filter(f -> f.word.equals(word)).findFirst();
  }

  static List<String> words() {
    return Arrays.stream(values()).map(f -> f.word).toList();
  }
}
