package loadmark.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import loadmark.network.Band;
import loadmark.network.Sweep;
import org.junit.jupiter.api.Test;

class SweepPointsTest {
  /** Exponential of a logarithm, a few roundings at exponents up to 15. */
  private static final double ROUNDING = 1e-13;

  @Test
  void stepsAreEqualOnALogarithmicAxisAndTheEndsExact() {
    double[] hz = SweepPoints.of(new Sweep(false, Optional.of(new Band(10, 1e6)), 101, 1));
    assertThat(hz).hasSize(101).isSorted();
    assertThat(hz[0]).isEqualTo(10);
    assertThat(hz[100]).isEqualTo(1e6);
    // 20 steps a decade: each is the 20th root of ten.
    assertThat(hz[1]).isCloseTo(10 * Math.pow(10, 0.05), within(10 * ROUNDING));
    assertThat(hz[20]).isCloseTo(100, within(100 * ROUNDING));
  }

  @Test
  void dcStandsFirst() {
    assertThat(SweepPoints.of(new Sweep(true, Optional.empty(), 50, 1))).containsExactly(0);
    double[] both = SweepPoints.of(new Sweep(true, Optional.of(new Band(1, 10)), 50, 1));
    assertThat(both).hasSize(51).startsWith(0, 1).endsWith(10);
  }
}
