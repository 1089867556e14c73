package loadmark.network;

/**
 * A node of the network.
 *
 * @param index its place in {@link Network#nodes()}; {@code ground} is 0
 */
public record Node(int index, String name) {
  public boolean isGround() {
    return index == 0;
  }
}
