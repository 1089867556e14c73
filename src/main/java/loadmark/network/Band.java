package loadmark.network;

/**
 * A closed interval of frequencies: a band, a single frequency where both ends are one, or DC where
 * both are 0.
 */
public record Band(double fromHz, double toHz) implements Comparable<Band> {
  public static final Band DC = new Band(0, 0);

  public Band {
    boolean ordered = fromHz <= toHz && Double.isFinite(toHz);
    if (!ordered || fromHz < 0 || (fromHz == 0 && toHz != 0)) {
      throw new IllegalArgumentException(fromHz + " Hz to " + toHz + " Hz");
    }
  }

  public static Band at(double hz) {
    return new Band(hz, hz);
  }

  public boolean isPoint() {
    return fromHz == toHz;
  }

  @Override
  public int compareTo(Band other) {
    int order = Double.compare(fromHz, other.fromHz);
    return order != 0 ? order : Double.compare(toHz, other.toHz);
  }
}
