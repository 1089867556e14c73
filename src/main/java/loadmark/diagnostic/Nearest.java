package loadmark.diagnostic;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/**
 * The word somebody may have meant: the one with the fewest letters inserted, dropped, replaced or
 * swapped with their neighbour, no letter touched twice (optimal string alignment; L. Boytsov,
 * Indexing methods for approximate dictionary searching, ACM J. Experimental Algorithmics 16, 2011,
 * section 2.2).
 */
public final class Nearest {
  /** Longer words are not compared. */
  private static final int LONGEST = 64;

  private Nearest() {}

  /**
   * The nearest of the words; where several are, one of the same length, then the first in
   * alphabetical order; empty where all are too far: more than one slip in up to four letters, two
   * in up to eight, else three.
   */
  public static Optional<String> find(String text, Collection<String> words) {
    if (text.length() > LONGEST) {
      return Optional.empty();
    }
    int allowed = text.length() < 2 ? 0 : text.length() <= 4 ? 1 : text.length() <= 8 ? 2 : 3;
    return words.stream()
        .filter(word -> !word.equals(text) && word.length() <= LONGEST)
        .filter(word -> Math.abs(word.length() - text.length()) <= allowed)
        .map(word -> new Candidate(word, distance(text, word)))
        .filter(c -> c.distance <= allowed || c.word.equalsIgnoreCase(text))
        .min(
            Comparator.comparingInt(Candidate::distance)
                .thenComparing(c -> c.word.length() != text.length())
                .thenComparing(Candidate::word))
        .map(Candidate::word);
  }

  private record Candidate(String word, int distance) {}

  /** How many slips lie between two words. */
  static int distance(String a, String b) {
    int[] twoBack = new int[b.length() + 1];
    int[] back = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      back[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] row = new int[b.length() + 1];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int replaced = back[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        row[j] = Math.min(replaced, Math.min(row[j - 1], back[j]) + 1);
        boolean swapped =
            i > 1
                && j > 1
                && a.charAt(i - 1) == b.charAt(j - 2)
                && a.charAt(i - 2) == b.charAt(j - 1);
        if (swapped) {
          row[j] = Math.min(row[j], twoBack[j - 2] + 1);
        }
      }
      twoBack = back;
      back = row;
    }
    return back[b.length()];
  }
}
