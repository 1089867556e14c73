package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class RelationTest {
  /** Rounding of a few operations on entries that lie within a decade of each other. */
  private static final double ROUNDING = 1e-12;

  private static final long SEED = 20_250_311;

  static List<Long> seeds() {
    return new Random(SEED).longs(50).boxed().toList();
  }

  private static Complex number(Random random, double size) {
    return new Complex(size * (2 * random.nextDouble() - 1), size * (2 * random.nextDouble() - 1));
  }

  private static Complex[] numbers(Random random, double size) {
    return Stream.generate(() -> number(random, size)).limit(4).toArray(Complex[]::new);
  }

  private static Matrix matrix(Complex... entries) {
    return new Matrix(
        Stream.of(entries)
            .map(e -> new loadmark.touchstone.Complex(e.getReal(), e.getImaginary()))
            .toList());
  }

  private static Complex at(Matrix matrix, int row, int column) {
    return new Complex(matrix.at(row, column).re(), matrix.at(row, column).im());
  }

  private static void assertClose(Complex actual, Complex expected, double scale, Object shown) {
    assertThat(actual.subtract(expected).abs())
        .as("%s: %s for %s", shown, actual, expected)
        .isCloseTo(0, within(ROUNDING * scale));
  }

  /**
   * D. M. Pozar, Microwave Engineering, table "Conversions between two-port network parameters": Z
   * from S against one reference.
   */
  @ParameterizedTest
  @MethodSource("seeds")
  void impedancesOfScatteringAreThoseOfTheTextbook(long seed) {
    Random random = new Random(seed);
    double z0 = 10 + 90 * random.nextDouble();
    Complex[] s = numbers(random, 0.6);
    Complex one = Complex.ONE;
    Complex product = s[1].multiply(s[2]);
    Complex below = one.subtract(s[0]).multiply(one.subtract(s[3])).subtract(product);
    Complex[] expected = {
      one.add(s[0]).multiply(one.subtract(s[3])).add(product),
      s[1].multiply(2),
      s[2].multiply(2),
      one.subtract(s[0]).multiply(one.add(s[3])).add(product)
    };
    Matrix z = Parameter.S.relate(matrix(s), List.of(z0, z0)).findImpedance().orElseThrow();
    for (int i = 0; i < 4; i++) {
      Complex entry = expected[i].multiply(z0).divide(below);
      assertClose(at(z, 1 + i / 2, 1 + i % 2), entry, z0 / below.abs(), seed);
    }
  }

  /** The same table: S from Z, the other way. */
  @ParameterizedTest
  @MethodSource("seeds")
  void scatteringOfImpedancesGivesTheImpedancesBack(long seed) {
    Random random = new Random(seed);
    double z0 = 50;
    Complex[] z = numbers(random, 100);
    z[0] = z[0].add(150);
    z[3] = z[3].add(150);
    Complex product = z[1].multiply(z[2]);
    Complex below = z[0].add(z0).multiply(z[3].add(z0)).subtract(product);
    Complex[] s = {
      z[0].subtract(z0).multiply(z[3].add(z0)).subtract(product).divide(below),
      z[1].multiply(2 * z0).divide(below),
      z[2].multiply(2 * z0).divide(below),
      z[0].add(z0).multiply(z[3].subtract(z0)).subtract(product).divide(below)
    };
    Matrix back = Parameter.S.relate(matrix(s), List.of(z0, z0)).findImpedance().orElseThrow();
    for (int i = 0; i < 4; i++) {
      // 1 − S loses what S has in common with 1.
      assertClose(at(back, 1 + i / 2, 1 + i % 2), z[i], 1e2 * 300, seed);
    }
  }

  /**
   * The definition: V = √r·(a + b), I = (a − b)/√r, b = S·a (K. Kurokawa, Power waves and the
   * scattering matrix, IEEE Trans. MTT 13(2), 1965, real references).
   */
  @ParameterizedTest
  @MethodSource("seeds")
  void anyWavesKeepTheRelation(long seed) {
    Random random = new Random(seed);
    double[] r = {10 + 90 * random.nextDouble(), 10 + 90 * random.nextDouble()};
    Complex[] s = numbers(random, 1);
    Complex[] a = {number(random, 1), number(random, 1)};
    PortRelation relation = Parameter.S.relate(matrix(s), List.of(r[0], r[1]));
    Complex[] v = new Complex[2];
    Complex[] i = new Complex[2];
    for (int port = 0; port < 2; port++) {
      Complex b = s[2 * port].multiply(a[0]).add(s[2 * port + 1].multiply(a[1]));
      v[port] = a[port].add(b).multiply(Math.sqrt(r[port]));
      i[port] = a[port].subtract(b).divide(Math.sqrt(r[port]));
    }
    for (int row = 1; row <= 2; row++) {
      Complex voltages =
          at(relation.voltage(), row, 1)
              .multiply(v[0])
              .add(at(relation.voltage(), row, 2).multiply(v[1]));
      Complex currents =
          at(relation.current(), row, 1)
              .multiply(i[0])
              .add(at(relation.current(), row, 2).multiply(i[1]));
      assertClose(voltages, currents, 1e3, seed);
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void admittanceIsTheInverseOfImpedance(long seed) {
    Random random = new Random(seed);
    Complex[] z = numbers(random, 1);
    z[0] = z[0].add(3);
    z[3] = z[3].add(3);
    Matrix y = Parameter.Z.relate(matrix(z), List.of(1.0, 1.0)).findAdmittance().orElseThrow();
    for (int row = 0; row < 2; row++) {
      for (int column = 0; column < 2; column++) {
        Complex sum =
            z[2 * row]
                .multiply(at(y, 1, column + 1))
                .add(z[2 * row + 1].multiply(at(y, 2, column + 1)));
        assertClose(sum, row == column ? Complex.ONE : Complex.ZERO, 1, seed);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void whatTheFileGivesIsNotTouched(long seed) {
    Random random = new Random(seed);
    Matrix values = matrix(numbers(random, 1e6));
    List<Double> references = List.of(50.0, 75.0);
    assertThat(Parameter.Z.relate(values, references).voltage()).isEqualTo(Matrix.UNIT);
    assertThat(Parameter.Z.relate(values, references).current()).isEqualTo(values);
    assertThat(Parameter.Y.relate(values, references).voltage()).isEqualTo(values);
    Matrix one = new Matrix(values.entries().subList(0, 1));
    assertThat(Parameter.Z.relate(one, List.of(50.0)).findImpedance()).contains(one);
    assertThat(Parameter.Y.relate(one, List.of(50.0)).findAdmittance()).contains(one);
  }

  @Test
  void openLacksAnImpedanceAndShortAnAdmittance() {
    PortRelation open = Parameter.S.relate(Matrix.ONE, List.of(50.0));
    assertThat(open.findImpedance()).isEmpty();
    assertThat(open.findAdmittance().orElseThrow().at(1, 1).isZero()).isTrue();
    Matrix minusOne = new Matrix(List.of(new loadmark.touchstone.Complex(-1, 0)));
    PortRelation shorted = Parameter.S.relate(minusOne, List.of(50.0));
    assertThat(shorted.findAdmittance()).isEmpty();
    assertThat(shorted.findImpedance().orElseThrow().at(1, 1).isZero()).isTrue();
  }

  /** S = Z/(Z + 2R) and 2R/(Z + 2R): a part in series has no impedance matrix, whatever it is. */
  @Test
  void partInSeriesHasNoImpedanceMatrixInSpiteOfRounding() {
    List<Integer> ohms = IntStream.rangeClosed(1, 1000).boxed().toList();
    assertThat(ohms)
        .allSatisfy(
            ohm -> {
              Complex reflected = new Complex(ohm / (ohm + 100.0));
              Complex passed = new Complex(100.0 / (ohm + 100.0));
              PortRelation relation =
                  Parameter.S.relate(
                      matrix(reflected, passed, passed, reflected), List.of(50.0, 50.0));
              assertThat(relation.findImpedance()).isEmpty();
              Matrix y = relation.findAdmittance().orElseThrow();
              assertClose(at(y, 1, 1), new Complex(1.0 / ohm), 1, ohm);
              assertClose(at(y, 2, 1), new Complex(-1.0 / ohm), 1, ohm);
            });
  }
}
