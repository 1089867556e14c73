package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Part;
import loadmark.response.RandomCircuits.Range;
import loadmark.response.RandomCircuits.Sample;
import org.junit.jupiter.api.Test;

/** What must not change a result. */
class InvarianceTest {
  /** In units of κ. */
  private static final double BOUND = 1e-14;

  private static final int SAMPLES = 100;

  @Test
  void orderOfTheLinesDoesNotMatter() {
    for (long seed = 0; seed < SAMPLES; seed++) {
      Sample sample = RandomCircuits.of(seed, Range.MILD);
      Network network = sample.circuit().network();
      List<Part> parts = new ArrayList<>(network.parts());
      List<Load> loads = new ArrayList<>(network.loads());
      Collections.shuffle(parts, new Random(seed));
      Collections.shuffle(loads, new Random(seed));
      Network shuffled =
          new Network(
              "",
              network.nodes(),
              parts,
              List.of(),
              network.ports(),
              loads,
              List.of(),
              List.of(),
              network.sweep());
      Ohms one = sample.circuit().compare(sample.with(), sample.without()).at(sample.hz()).with();
      Ohms other =
          Responses.of(shuffled, network.ports().get(0))
              .compare(sample.with(), sample.without())
              .at(sample.hz())
              .with();
      ExactNetwork exact = new ExactNetwork(network, sample.with(), sample.hz());
      double condition = exact.condition(exact.solve());
      double apart = Math.hypot(one.re() - other.re(), one.im() - other.im());
      assertThat(apart / one.magnitude())
          .as("seed %d", seed)
          .isLessThanOrEqualTo(BOUND * condition);
    }
  }

  @Test
  void pointAloneIsThatOfTheSweep() {
    Sample sample = RandomCircuits.of(3, Range.MILD);
    double[] hz =
        IntStream.range(0, 1000).mapToDouble(i -> 10 * Math.pow(1e6, i / 999.0)).toArray();
    Comparison compared = sample.circuit().compare(sample.with(), sample.without());
    List<Loading> sweep = compared.at(hz);
    for (int i = 0; i < hz.length; i += 37) {
      assertThat(compared.at(hz[i])).isEqualTo(sweep.get(i));
    }
  }

  @Test
  void threadsDoNotDisturbEachOther() {
    Sample sample = RandomCircuits.of(4, Range.MILD);
    double[] hz = IntStream.range(0, 500).mapToDouble(i -> 10 * Math.pow(1e6, i / 499.0)).toArray();
    Comparison compared = sample.circuit().compare(sample.with(), sample.without());
    List<Loading> alone = compared.at(hz);
    List<List<Loading>> together =
        IntStream.range(0, 16).parallel().mapToObj(i -> compared.at(hz)).toList();
    assertThat(together).allMatch(alone::equals);
  }
}
