package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import loadmark.response.RandomCircuits.Range;
import loadmark.response.RandomCircuits.Sample;
import org.apfloat.Apcomplex;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The engine against arbitrary precision on random networks. */
class AccuracyTest {
  private static final double UNIT = 0x1p-53;

  /** What is promised of Z, in units of κ·2⁻⁵³. */
  private static final double IMPEDANCE_BOUND = 1000;

  /** What is promised of the change, beside its own conditioning. */
  private static final double CHANGE_BOUND = 1e-9;

  /** How far above the true error (or one rounding) an estimate may typically be. */
  private static final double TYPICAL_EXCESS = 1000;

  /** Smaller changes are far below anything that is judged. */
  private static final double LEAST_CHANGE = 1e-30;

  private static final int SAMPLE = 150;
  private static final int ALL = 2000;

  @ParameterizedTest
  @MethodSource("loadmark.response.RandomCircuits$Range#both")
  void aSampleIsWithinItsBounds(Range range) {
    check(range, 1, SAMPLE);
  }

  @ParameterizedTest
  @MethodSource("loadmark.response.RandomCircuits$Range#both")
  @Tag("thorough")
  void allAreWithinTheirBounds(Range range) {
    check(range, 1_000, ALL);
  }

  private static void check(Range range, long firstSeed, int count) {
    double[] excess = new double[3 * count];
    double worst = 0;
    double worstChange = 0;
    for (int i = 0; i < count; i++) {
      long seed = firstSeed + i;
      String which = range.name() + " seed " + seed;
      Sample sample = RandomCircuits.of(seed, range);
      Loading found = sample.circuit().compare(sample.with(), sample.without()).at(sample.hz());
      ExactNetwork bare =
          new ExactNetwork(sample.circuit().network(), sample.without(), sample.hz());
      ExactNetwork loaded =
          new ExactNetwork(sample.circuit().network(), sample.with(), sample.hz());
      Apcomplex without = bare.solve();
      Apcomplex with = loaded.solve();
      assertThat(found.without().isFinite() && found.with().isFinite()).as(which).isTrue();
      assertThat(found.change().isFinite()).as(which).isTrue();
      double error = ExactNetwork.error(without, found.without().re(), found.without().im());
      double condition = bare.condition(without);
      assertThat(error).as(which).isLessThanOrEqualTo(IMPEDANCE_BOUND * condition * UNIT);
      assertThat(error).as(which).isLessThanOrEqualTo(found.withoutError());
      worst = Math.max(worst, error / condition / UNIT);
      excess[3 * i] = found.withoutError() / Math.max(error, UNIT);

      error = ExactNetwork.error(with, found.with().re(), found.with().im());
      condition = loaded.condition(with);
      assertThat(error).as(which).isLessThanOrEqualTo(IMPEDANCE_BOUND * condition * UNIT);
      assertThat(error).as(which).isLessThanOrEqualTo(found.withError());
      worst = Math.max(worst, error / condition / UNIT);
      excess[3 * i + 1] = found.withError() / Math.max(error, UNIT);

      Apcomplex change = with.divide(without).subtract(Apcomplex.ONE);
      error = ExactNetwork.error(change, found.change().re(), found.change().im());
      if (ExactNetwork.abs(change) > LEAST_CHANGE) {
        double own = IMPEDANCE_BOUND * bare.conditionOfChange(loaded, without, with) * UNIT;
        assertThat(error).as(which).isLessThanOrEqualTo(CHANGE_BOUND + own);
        excess[3 * i + 2] = found.changeError() / Math.max(error, UNIT);
        worstChange = Math.max(worstChange, error);
        assertThat(error).as(which).isLessThanOrEqualTo(found.changeError());
      } else {
        assertThat(found.change().magnitude()).as(which).isLessThan(2 * LEAST_CHANGE);
      }
    }
    Arrays.sort(excess);
    assertThat(excess[excess.length / 2]).as("median excess").isLessThan(TYPICAL_EXCESS);
    System.out.printf(
        "%s: worst Z %.3g κu, worst change %.3g, estimate over error: median %.3g, 9 of 10 %.3g,"
            + " 99 of 100 %.3g%n",
        range.name(),
        worst,
        worstChange,
        excess[excess.length / 2],
        excess[excess.length * 9 / 10],
        excess[excess.length * 99 / 100]);
  }
}
