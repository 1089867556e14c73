package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.SortedSet;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class RoundTripTest {
  private static final long SEED = 20_020_417;

  static List<Long> seeds() {
    return new Random(SEED).longs(25).boxed().toList();
  }

  /** All bits drawn, the exponent within a range that a network may have. */
  private static double any(Random random) {
    if (random.nextInt(10) == 0) {
      return random.nextBoolean() ? 0 : random.nextInt(100) - 50;
    }
    long bits = random.nextLong() & 0x800F_FFFF_FFFF_FFFFL;
    return Double.longBitsToDouble(bits | (long) (23 + random.nextInt(2000)) << 52);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void impedancesReadBackToTheLastDigit(long seed) {
    Random random = new Random(seed);
    SortedSet<Double> frequencies = new TreeSet<>();
    frequencies.add(0.0);
    for (int i = 0; i < 200; i++) {
      frequencies.add(Math.abs(any(random)) + 0.0);
    }
    List<ImpedancePoint> points = new ArrayList<>();
    for (double hz : frequencies) {
      points.add(new ImpedancePoint(hz, new Complex(any(random), any(random))));
    }
    MeasuredData data = Read.onePort(Touchstone.writeOnePort(List.of("anything"), points));
    assertThat(data.size()).isEqualTo(points.size());
    for (ImpedancePoint point : points) {
      Complex z = data.find(point.hz()).flatMap(PortRelation::findImpedance).orElseThrow().at(1, 1);
      assertThat(z.re()).as("seed %s, %s", seed, point).isEqualTo(point.impedance().re());
      assertThat(z.im()).as("seed %s, %s", seed, point).isEqualTo(point.impedance().im());
    }
  }

  @Test
  void fileIsWrittenInOneForm() {
    List<ImpedancePoint> points =
        List.of(
            new ImpedancePoint(0, Complex.ZERO),
            new ImpedancePoint(1e3, new Complex(0.1, -2.5e-9)),
            new ImpedancePoint(2.5e9, new Complex(-1e6, 1)));
    assertThat(Touchstone.writeOnePort(List.of("port input", "Prüfling\nΩ"), points))
        .isEqualTo(
            """
            ! port input
            ! Pr\\u00fcfling\\u000a\\u03a9
            # Hz Z RI R 1
            0 0 0
            1000 0.1 -2.5e-9
            2.5e9 -1e6 1
            """);
  }

  @Test
  void pointsThatMakeNoFileAreRefused() {
    ImpedancePoint point = new ImpedancePoint(1e3, Complex.ONE);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Touchstone.writeOnePort(List.of(), List.of()));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Touchstone.writeOnePort(List.of(), List.of(point, point)));
    assertThatIllegalArgumentException().isThrownBy(() -> new ImpedancePoint(-1, Complex.ONE));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new ImpedancePoint(1, new Complex(Double.NaN, 0)));
  }
}
