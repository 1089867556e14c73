package loadmark.judge;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.response.Comparison;
import loadmark.response.Ohms;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Random sums of resonators (Foster, A Reactance Theorem, Bell System Technical Journal 3, 1924,
 * with losses) against a scan that knows where the resonances are.
 */
class ResonatorScanTest {
  private static final Band BAND = new Band(1e3, 1e6);
  private static final double LOWEST_Q = 1;
  private static final double HIGHEST_Q = 5000;

  /** Points around each resonance, out to twenty of its widths, and over the band. */
  private static final int NEAR = 4000;

  private static final int EVEN = 20_000;

  static LongStream few() {
    return LongStream.range(1, 31);
  }

  static LongStream many() {
    return LongStream.range(1000, 2000);
  }

  @ParameterizedTest
  @MethodSource("few")
  void noBandOfAFewRandomNetworksIsMissed(long seed) {
    check(seed);
  }

  @Tag("thorough")
  @ParameterizedTest
  @MethodSource("many")
  void noBandOfManyRandomNetworksIsMissed(long seed) {
    check(seed);
  }

  private static void check(long seed) {
    Random random = new Random(seed);
    List<Resonator> resonators =
        IntStream.rangeClosed(0, random.nextInt(6)).mapToObj(i -> resonator(random)).toList();
    List<Resonator> loaded =
        resonators.stream()
            .map(r -> new Resonator(r.ohm(), r.hz() * (1 + 1e-4 * random.nextDouble()), r.q()))
            .toList();
    Comparison comparison = Formula.of(sum(resonators), sum(loaded));
    Limit limit = limit(random, comparison);
    Gauge gauge = new Gauge(comparison, Measure.of(limit));
    List<Sample> scan = scan(resonators, loaded).stream().map(gauge::at).toList();
    LimitJudgement result = Formula.judge(comparison, limit);
    List<Band> bands = result.bands().stream().map(BrokenBand::band).toList();
    for (Sample sample : scan) {
      boolean claimed =
          bands.stream().anyMatch(b -> b.fromHz() <= sample.hz() && sample.hz() <= b.toHz());
      if (Math.abs(sample.excess()) > 1e-6) {
        assertThat(claimed)
            .as(
                "seed %d, %s %s at %s Hz: %s",
                seed, limit.criterion(), limit.bound(), sample.hz(), sample.reading())
            .isEqualTo(sample.isBroken());
      }
    }
    double seen = scan.stream().mapToDouble(Sample::excess).max().orElseThrow();
    double worst = gauge.at(result.worst().orElseThrow().hz()).excess();
    assertThat(worst).as("seed %d, worst excess", seed).isGreaterThanOrEqualTo(seen - 1e-9);
  }

  private static Resonator resonator(Random random) {
    return new Resonator(
        between(random, 1, 1000), between(random, 2e3, 5e5), between(random, LOWEST_Q, HIGHEST_Q));
  }

  private static double between(Random random, double from, double to) {
    return from * Math.pow(to / from, random.nextDouble());
  }

  private static DoubleFunction<Ohms> sum(List<Resonator> resonators) {
    return hz -> {
      Complex z = new Complex(10);
      for (Resonator one : resonators) {
        z = z.add(Formula.complex(one.parallel().apply(hz)));
      }
      return Formula.ohms(z);
    };
  }

  /** A limit about as strict as the network is at some frequency. */
  private static Limit limit(Random random, Comparison comparison) {
    double hz = between(random, BAND.fromHz(), BAND.toHz());
    double size = comparison.at(hz).with().magnitude();
    return switch (random.nextInt(9)) {
      case 0 -> Formula.limit(Criterion.MAGNITUDE, Bound.atMost(1.2 * size), BAND);
      case 1 -> Formula.limit(Criterion.MAGNITUDE, Bound.between(0.9 * size, 2 * size), BAND);
      case 2 -> Formula.limit(Criterion.PHASE, Bound.between(-60, 40 * random.nextDouble()), BAND);
      case 3 ->
          Formula.limit(Criterion.RETURN_LOSS, Bound.atLeast(10), Formula.resistor(2 * size), BAND);
      case 4 ->
          Formula.limit(Criterion.MAGNITUDE_CHANGE, Bound.atMost(between(random, 1e-6, 0.1)), BAND);
      case 5 -> Formula.limit(Criterion.PHASE_CHANGE, Bound.atMost(between(random, 1e-4, 9)), BAND);
      case 6 -> Formula.limit(Criterion.PARALLEL_RESISTANCE, Bound.atLeast(1.5 * size), BAND);
      case 7 ->
          Formula.limit(
              Criterion.PARALLEL_CAPACITANCE,
              Bound.between(-1 / (Formula.omega(hz) * size), 0.5 / (Formula.omega(hz) * size)),
              BAND);
      default -> Formula.limit(Criterion.CHANGE, Bound.atMost(between(random, 1e-6, 0.1)), BAND);
    };
  }

  private static List<Double> scan(List<Resonator> resonators, List<Resonator> loaded) {
    List<Double> points = new ArrayList<>();
    for (int i = 0; i <= EVEN; i++) {
      points.add(BAND.fromHz() * Math.pow(BAND.toHz() / BAND.fromHz(), (double) i / EVEN));
    }
    List<Resonator> all = new ArrayList<>(resonators);
    all.addAll(loaded);
    for (Resonator one : all) {
      for (int i = -NEAR; i <= NEAR; i++) {
        double hz = one.hz() * Math.exp(20.0 * i / NEAR / one.q());
        if (hz > BAND.fromHz() && hz < BAND.toHz()) {
          points.add(hz);
        }
      }
    }
    return points;
  }
}
