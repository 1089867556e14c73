package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DecimalTest {
  private static final long SEED = 754;

  @Test
  void numbersAreRoundedOnceInTheirUnit() {
    Random random = new Random(SEED);
    for (int i = 0; i < 20_000; i++) {
      BigDecimal exact =
          new BigDecimal(new BigInteger(1 + random.nextInt(70), random), random.nextInt(40) - 15);
      String text = i % 2 == 0 ? exact.toString() : exact.toPlainString();
      int tenfold = 3 * random.nextInt(4);
      assertThat(Decimal.parse(text, tenfold))
          .as("seed %s: %s", SEED, text)
          .isEqualTo(exact.scaleByPowerOfTen(tenfold).doubleValue());
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "+",
        "-",
        ".",
        "e5",
        ".e5",
        "1e",
        "1e+",
        "1e5.",
        "1.2.3",
        "--1",
        "1-",
        "1_0",
        "0x1p3",
        "1f",
        "1d",
        "1L",
        "NaN",
        "Infinity",
        "inf",
        "١",
        "1 ",
        "1e5e5",
        "1,5",
        "1D5",
        "∞"
      })
  void whatIsNoNumberIsNone(String text) {
    assertThat(Decimal.parse(text, 0)).isNaN();
    assertThat(Decimal.parse(text, 9)).isNaN();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"1e309", "-1e309", "1e99999999999", "1e-400", "-0.1e-99999999999", "2e2147483647"})
  void whatIsBeyondDoublesIsInfinite(String text) {
    assertThat(Decimal.parse(text, 0)).isInfinite();
    assertThat(Decimal.parse(text, 9)).isInfinite();
  }

  @Test
  void zeroIsZeroWhateverItsExponent() {
    assertThat(Decimal.parse("0e99999999999", 9)).isZero();
    assertThat(Decimal.parse("-0.000e-5", 9)).isZero();
  }
}
