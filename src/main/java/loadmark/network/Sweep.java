package loadmark.network;

import java.util.Optional;

/**
 * The frequencies that are judged.
 *
 * @param dc whether DC is among them
 * @param band positive frequencies, both ends in; empty for DC alone
 * @param points how many the band has in tables and pictures, both ends in; at least 50
 */
public record Sweep(boolean dc, Optional<Band> band, int points, int line) {
  public static final int LEAST_POINTS = 50;
  public static final int DEFAULT_PER_DECADE = 20;

  public Sweep {
    if (!dc && band.isEmpty()) {
      throw new IllegalArgumentException("a sweep of nothing");
    }
  }
}
