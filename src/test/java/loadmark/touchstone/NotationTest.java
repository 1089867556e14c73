package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NotationTest {
  /** Turning degrees into radians costs a rounding of the angle. */
  private static final double ROUNDING = 1e-15;

  private static final long SEED = 1_905;

  @ParameterizedTest
  @CsvSource({
    "0, 1, 0",
    "90, 0, 1",
    "180, -1, 0",
    "270, 0, -1",
    "360, 1, 0",
    "-90, 0, -1",
    "-180, -1, 0",
    "450, 0, 1",
    "540, -1, 0",
    "-810, 0, -1",
    "36000000180, -1, 0"
  })
  void rightAnglesAreExact(double degrees, double re, double im) {
    // Adding 0 leaves the sign of a zero out.
    assertThat(Notation.MA.re(1, degrees) + 0.0).isEqualTo(re);
    assertThat(Notation.MA.im(1, degrees) + 0.0).isEqualTo(im);
    assertThat(Notation.DB.re(0, degrees) + 0.0).isEqualTo(re);
    assertThat(Notation.DB.im(0, degrees) + 0.0).isEqualTo(im);
  }

  @Test
  void otherAnglesAreThoseOfTheCircle() {
    Random random = new Random(SEED);
    for (int i = 0; i < 10_000; i++) {
      double degrees = 720 * random.nextDouble() - 360;
      double radians = Math.toRadians(degrees);
      assertThat(Notation.MA.re(1, degrees))
          .as("seed %s: %s", SEED, degrees)
          .isCloseTo(Math.cos(radians), within(2 * ROUNDING));
      assertThat(Notation.MA.im(1, degrees))
          .as("seed %s: %s", SEED, degrees)
          .isCloseTo(Math.sin(radians), within(2 * ROUNDING));
    }
  }

  @Test
  void decibelsAreTwentyADecade() {
    assertThat(Notation.DB.re(40, 0)).isCloseTo(100, within(100 * ROUNDING));
    assertThat(Notation.DB.im(-20, 90)).isCloseTo(0.1, within(ROUNDING));
    // 10^0.3 to 20 digits: 1.9952623149688796014.
    assertThat(Notation.DB.re(6, 0)).isCloseTo(1.9952623149688795, within(2 * ROUNDING));
  }

  @Test
  void onlyMagnitudesMayNotBeNegative() {
    assertThat(Notation.MA.refuses(-0.5)).isTrue();
    assertThat(Notation.MA.refuses(0)).isFalse();
    assertThat(Notation.DB.refuses(-0.5)).isFalse();
    assertThat(Notation.RI.refuses(-0.5)).isFalse();
  }
}
