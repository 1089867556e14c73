package loadmark.response;

import java.util.Arrays;
import java.util.List;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;

/** Stand-in: 100 Ω, and 90 Ω with any load. */
public final class Responses {
  private Responses() {}

  public static PortResponse of(Network network, Port port) {
    return (loads, against) -> new Constant(loads, against);
  }

  private record Constant(List<Load> loads, List<Load> against) implements Comparison {
    @Override
    public Loading at(double hz) {
      Ohms without = Ohms.of(against.isEmpty() ? 100 : 90, 0);
      Ohms with = Ohms.of(loads.isEmpty() ? 100 : 90, 0);
      Change change = Change.of(with.re() / without.re() - 1, 0);
      return new Loading(hz, without, with, change, 0, 0, 0);
    }

    @Override
    public List<Loading> at(double[] hz) {
      return Arrays.stream(hz).mapToObj(this::at).toList();
    }
  }
}
