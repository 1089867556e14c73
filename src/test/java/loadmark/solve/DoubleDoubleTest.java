package loadmark.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Against decimal arithmetic of 60 digits. */
class DoubleDoubleTest {
  private static final MathContext DIGITS = new MathContext(60);

  /** Joldes, Muller, Popescu 2017: sums to 3·2⁻¹⁰⁶, products to 5·2⁻¹⁰⁶, quotients to 10·2⁻¹⁰⁶. */
  private static final double BOUND = 10 * 0x1p-106;

  private static final int SAMPLES = 20_000;

  private static DoubleDouble random(Random random) {
    double hi = Math.scalb(random.nextDouble() - 0.5, random.nextInt(60) - 30);
    return DoubleDouble.sum(hi, hi * 0x1p-54 * (random.nextDouble() - 0.5));
  }

  private static BigDecimal exact(DoubleDouble x) {
    return new BigDecimal(x.hi()).add(new BigDecimal(x.lo()));
  }

  private static void check(DoubleDouble found, BigDecimal expected, long sample) {
    BigDecimal error = exact(found).subtract(expected).abs();
    assertThat(error.doubleValue())
        .as("sample %d", sample)
        .isLessThanOrEqualTo(BOUND * Math.abs(expected.doubleValue()));
  }

  @Test
  void operationsKeep32Digits() {
    Random random = new Random(1);
    for (long i = 0; i < SAMPLES; i++) {
      DoubleDouble a = random(random);
      DoubleDouble b = random(random);
      check(a.plus(b), exact(a).add(exact(b)), i);
      check(a.minus(b), exact(a).subtract(exact(b)), i);
      check(a.times(b), exact(a).multiply(exact(b)), i);
      check(a.over(b), exact(a).divide(exact(b), DIGITS), i);
    }
  }

  @Test
  void nearlyEqualNumbersLoseNothing() {
    DoubleDouble a = new DoubleDouble(1, 0x1p-60);
    DoubleDouble b = new DoubleDouble(1, -0x1p-70);
    check(a.minus(b), new BigDecimal(0x1p-60 + 0x1p-70), 0);
  }
}
