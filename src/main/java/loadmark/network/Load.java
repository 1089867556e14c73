package loadmark.network;

/**
 * What may be hung on the network. A shunt load is absent as an open, a series load as a join.
 *
 * @param text the value as the user wrote it
 */
public record Load(
    String name,
    Placement placement,
    Node first,
    Node second,
    OnePort value,
    String text,
    int line) {

  /** Across two nodes, or between them. */
  public enum Placement {
    SHUNT,
    SERIES
  }
}
