package loadmark.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;
import java.util.Random;
import loadmark.network.Bound;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ValuesTest {
  private static final Limit TWO_PERCENT =
      Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 1, "limit change 2 %");

  @ParameterizedTest
  @CsvSource({
    "0.0341234, 3.412 %",
    "0.0120456, 1.205 %",
    "0.0200003, 2.00003 %",
    "0.02000004, 2.000004 %",
    "0.0199999, 2.000 %",
    "0.02, 2.000 %",
    "0.020000000001, 2.000 %",
    "0, 0 %",
  })
  void valueStandsOnItsOwnSideOfAnUpperBound(double value, String shown) {
    assertThat(Values.worst(TWO_PERCENT, Samples.worst(1e3, value))).isEqualTo(shown);
  }

  @ParameterizedTest
  @CsvSource({"19.99998, 19.99998 dB", "20.0, 20.00 dB", "20.00002, 20.00 dB", "18.237, 18.24 dB"})
  void valueStandsOnItsOwnSideOfALowerBound(double value, String shown) {
    Limit limit =
        Samples.limit(Criterion.RETURN_LOSS, Bound.atLeast(20), 1, "limit return loss 20 dB");
    assertThat(Values.worst(limit, Samples.worst(1e3, value))).isEqualTo(shown);
  }

  @Test
  void seededValuesNeverSeemToStandOnTheWrongSide() {
    long seed = 20260101;
    Random random = new Random(seed);
    for (int i = 0; i < 2000; i++) {
      double bound = Math.round(random.nextDouble() * 1000) / 1000.0 + 0.001;
      double value = bound * (1 + random.nextGaussian() * Math.pow(10, -1 - random.nextInt(8)));
      int digits = Values.digits(value, OptionalDouble.empty(), OptionalDouble.of(bound));
      double shown = Unit.rounded(Unit.decimal(value), digits).doubleValue();
      // A limit is kept up to 1e-9 past its bound; the language says so.
      boolean broken = value > bound * (1 + 1e-9);
      assertThat(shown > bound).as("seed %d: %s against %s", seed, value, bound).isEqualTo(broken);
    }
  }

  @Test
  void boundsReadAsTheyWereWritten() {
    assertThat(bound(Criterion.CHANGE, Bound.atMost(0.07))).isEqualTo("at most 7 %");
    assertThat(bound(Criterion.CHANGE, Bound.atMost(0.02).orAtMostOhm(5)))
        .isEqualTo("at most 2 % or 5 Ω");
    assertThat(bound(Criterion.CHANGE, Bound.atMostOhm(5))).isEqualTo("at most 5 Ω");
    assertThat(bound(Criterion.RETURN_LOSS, Bound.atLeast(20))).isEqualTo("at least 20 dB");
    assertThat(bound(Criterion.RETURN_LOSS, Bound.atLeast(9.636))).isEqualTo("at least 9.636 dB");
    assertThat(bound(Criterion.PHASE, Bound.between(-10, 10))).isEqualTo("-10° to 10°");
    assertThat(bound(Criterion.PHASE_WITHIN, Bound.atMost(11.5))).isEqualTo("at most 11.5°");
    assertThat(bound(Criterion.PARALLEL_CAPACITANCE, Bound.atMost(75e-12)))
        .isEqualTo("at most 75 pF");
    assertThat(bound(Criterion.PARALLEL_RESISTANCE, Bound.between(23750, 26250)))
        .isEqualTo("23.75 kΩ to 26.25 kΩ");
    assertThat(bound(Criterion.MAGNITUDE, Bound.between(50 * (1 - 0.2), 50 * (1 + 0.2))))
        .isEqualTo("40 Ω to 60 Ω");
    assertThat(bound(Criterion.MAGNITUDE, Bound.atLeast(123456))).isEqualTo("at least 123.456 kΩ");
  }

  private static String bound(Criterion criterion, Bound bound) {
    return Values.bound(Samples.limit(criterion, bound, 1, ""));
  }
}
