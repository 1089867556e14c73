package loadmark.diagnostic;

import java.util.Collection;
import java.util.Optional;

/** The name that was probably meant. Stand-in. */
public final class Nearest {
  private Nearest() {}

  /** The closest of {@code known} to {@code written}, where one is close enough to be a slip. */
  public static Optional<String> find(String written, Collection<String> known) {
    int least = Math.max(1, written.length() / 3) + 1;
    String nearest = null;
    for (String candidate : known) {
      int distance = distance(written, candidate);
      if (distance < least) {
        least = distance;
        nearest = candidate;
      }
    }
    return Optional.ofNullable(nearest);
  }

  /** Edit distance, neighbours swapped counting once (Damerau, Comm. ACM 7(3), 1964). */
  private static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        if (i == 0 || j == 0) {
          d[i][j] = i + j;
          continue;
        }
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        d[i][j] = Math.min(d[i - 1][j - 1] + change, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
        if (i > 1
            && j > 1
            && a.charAt(i - 1) == b.charAt(j - 2)
            && a.charAt(i - 2) == b.charAt(j - 1)) {
          d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
        }
      }
    }
    return d[a.length()][b.length()];
  }
}
