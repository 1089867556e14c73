package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class InterpolationTest {
  /** A handful of roundings. */
  private static final double ROUNDING = 1e-14;

  private static final long SEED = 31_415;

  static List<Long> seeds() {
    return new Random(SEED).longs(50).boxed().toList();
  }

  /** Two ports of random S of Frobenius norm 1, which bounds the largest singular value. */
  private static MeasuredData passive(Random random, int size) {
    double[] hz = random.doubles(size, 0, 1e9).sorted().distinct().toArray();
    double[] values = random.doubles(8L * hz.length, -1, 1).toArray();
    for (int point = 0; point < hz.length; point++) {
      double square = 0;
      for (int i = 8 * point; i < 8 * point + 8; i++) {
        square += values[i] * values[i];
      }
      for (int i = 8 * point; i < 8 * point + 8; i++) {
        values[i] /= Math.sqrt(square);
      }
    }
    return new MeasuredData(Parameter.S, List.of(50.0, 50.0), hz, values);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void atItsOwnPointsDataIsExactlyItself(long seed) {
    MeasuredData data = passive(new Random(seed), 100);
    for (int point = 0; point < data.size(); point++) {
      assertThat(data.findValues(data.hz(point))).contains(data.values(point));
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void betweenPointsEveryPartGoesAlongAStraightLine(long seed) {
    Random random = new Random(seed);
    MeasuredData data = passive(random, 20);
    for (int point = 0; point + 1 < data.size(); point++) {
      double share = random.nextDouble();
      double hz = data.hz(point) + share * (data.hz(point + 1) - data.hz(point));
      double at = (hz - data.hz(point)) / (data.hz(point + 1) - data.hz(point));
      Matrix found = data.findValues(hz).orElseThrow();
      for (int i = 0; i < 4; i++) {
        Complex below = data.values(point).entries().get(i);
        Complex above = data.values(point + 1).entries().get(i);
        Complex line = below.times(1 - at).plus(above.times(at));
        assertThat(found.entries().get(i).minus(line).magnitude())
            .as("seed %s", seed)
            .isCloseTo(0, within(ROUNDING));
      }
    }
  }

  /** Energy: with 1 − S*S not negative at both points, no waves come back larger between them. */
  @ParameterizedTest
  @MethodSource("seeds")
  void whatIsPassiveAtBothPointsIsPassiveBetween(long seed) {
    Random random = new Random(seed);
    MeasuredData data = passive(random, 20);
    for (int trial = 0; trial < 200; trial++) {
      double hz = data.fromHz() + random.nextDouble() * (data.toHz() - data.fromHz());
      Matrix s = data.findValues(hz).orElseThrow();
      Complex a = new Complex(random.nextGaussian(), random.nextGaussian());
      Complex b = new Complex(random.nextGaussian(), random.nextGaussian());
      double in = Math.hypot(a.magnitude(), b.magnitude());
      double out =
          Math.hypot(
              s.at(1, 1).times(a).plus(s.at(1, 2).times(b)).magnitude(),
              s.at(2, 1).times(a).plus(s.at(2, 2).times(b)).magnitude());
      assertThat(out).as("seed %s", seed).isLessThanOrEqualTo(in * (1 + ROUNDING));
    }
  }

  @Test
  void thereIsNothingOutsideTheData() {
    MeasuredData data = Read.onePort("# Hz Z RI R 1\n100 1 0\n200 2 0\n");
    DoubleStream.of(-1, 0, Math.nextDown(100.0), Math.nextUp(200.0), 1e300)
        .forEach(hz -> assertThat(data.find(hz)).isEmpty());
    assertThat(data.find(Double.NaN)).isEmpty();
    assertThat(data.find(Double.POSITIVE_INFINITY)).isEmpty();
    assertThat(data.covers(100)).isTrue();
    assertThat(data.covers(200)).isTrue();
    assertThat(data.covers(Math.nextUp(200.0))).isFalse();
  }

  @Test
  void directCurrentIsAPointWhereTheFileHasIt() {
    MeasuredData data = Read.onePort("# Hz Z RI R 1\n0 1 0\n200 2 0\n");
    assertThat(data.findValues(0).orElseThrow().at(1, 1)).isEqualTo(new Complex(1, 0));
    assertThat(data.findValues(-0.0)).isEqualTo(data.findValues(0));
  }

  @Test
  void openStaysOpenAndShortStaysShortBetween() {
    MeasuredData open = Read.onePort("# Hz S MA R 50\n100 1 0\n201 1 360\n");
    MeasuredData shorted = Read.onePort("# Hz S MA R 50\n100 1 180\n201 1 -180\n");
    new Random(SEED)
        .doubles(1000, 100, 201)
        .forEach(
            hz -> {
              assertThat(open.find(hz).orElseThrow().findImpedance()).isEmpty();
              assertThat(shorted.find(hz).orElseThrow().findAdmittance()).isEmpty();
            });
  }

  /** An inductance below a parallel resonance, a capacitance above it: the reactance has a pole. */
  @Test
  void reflectionPassesAParallelResonanceWithoutAPole() {
    MeasuredData data = Read.onePort("# Hz S RI R 50\n100 0.75 0.5\n200 0.75 -0.5\n");
    PortRelation between = data.find(150).orElseThrow();
    // Z = 50 (1 + 0.75)/(1 - 0.75)
    assertThat(between.findImpedance().orElseThrow().at(1, 1)).isEqualTo(new Complex(350, 0));
  }

  @Test
  void whatTheFileGivesIsKept() {
    MeasuredData data = Read.twoPort("# kHz Y RI R 50\n1 1 0 2 0 3 0 4 0\n");
    assertThat(data.parameter()).isEqualTo(Parameter.Y);
    assertThat(data.ports()).isEqualTo(2);
    assertThat(data.referenceOhm()).containsExactly(50.0, 50.0);
    assertThat(data.size()).isEqualTo(1);
    assertThat(data.fromHz()).isEqualTo(1000);
    assertThat(data.toHz()).isEqualTo(1000);
    // Siemens: what the file gives, divided by 50 Ω.
    assertThat(data.values(0).at(2, 1)).isEqualTo(new Complex(0.04, 0));
  }
}
