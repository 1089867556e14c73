package loadmark.response;

import java.util.List;
import java.util.Optional;
import loadmark.network.Band;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;

/**
 * Where a criterion may cross a level, found algebraically for networks of constant elements: no
 * crossing hides between points. Thread-safe.
 */
public interface Crossings {

  /** Why there is no algebraic answer, in words for people; empty where there is one. */
  Optional<String> findObstacle();

  /**
   * Every frequency of the band where the criterion may have the level, and some where it has not:
   * points where it comes near, and those where it has the opposite value. A lone candidate is
   * right to about 1e-12 of itself, one of a close pair to rounding over their distance, and where
   * the change is below 1e-8 and poles with and without the loads all but coincide, to about 1e-5.
   * What happens between neighbouring candidates, and at them, is for the accurate responses to
   * say.
   *
   * @param band positive frequencies
   * @return Hz, ascending, inside the band; empty where the criterion is constant
   * @throws IllegalStateException where there is an obstacle
   * @throws ArithmeticException where the algebra failed, so that nothing is known
   */
  double[] candidates(Level level, Band band);

  /** No algebraic answer, and why. */
  static Crossings none(String why) {
    return new Crossings() {
      @Override
      public Optional<String> findObstacle() {
        return Optional.of(why);
      }

      @Override
      public double[] candidates(Level level, Band band) {
        throw new IllegalStateException(why);
      }
    };
  }

  /** The crossings of one port with one set of loads against another. */
  static Crossings of(Network network, Port port, List<Load> loads, List<Load> against) {
    return new AlgebraicCrossings(network, port, loads, against);
  }
}
