package loadmark.evidence;

import static loadmark.evidence.ClosedForm.c;
import static loadmark.evidence.ClosedForm.l;
import static loadmark.evidence.ClosedForm.parallel;
import static loadmark.evidence.ClosedForm.r;
import static loadmark.evidence.ClosedForm.series;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Networks whose impedance a standard or a handbook gives. */
class PublishedValuesTest {
  /** What the tool promises for values it works out, relative. */
  private static final double CLOSED_FORM = 1e-9;

  /** One in the last of two decimals, and its rounding: printed tables are off by one at times. */
  private static final double TWO_DECIMALS = 0.015;

  /** CISPR 16-1-2, V-network, 9 kHz to 150 kHz: 50 Ω ∥ (50 µH + 5 Ω); published. */
  private static final String MAINS_LOW =
      """
      inductor coil = 50 µH
      resistor foot = 5 Ω
      wire device -- coil -- mid -- foot -- ground
      port device = device -- ground
      load receiver shunt device -- ground = 50 Ω
      sweep 9 kHz to 150 kHz
      limit within 20 %, 11.5 deg of 50 Ω || (50 µH + 5 Ω)
      """;

  @ParameterizedTest
  @CsvSource({
    "9, 5.22, 26.55",
    "15, 6.22, 38.41",
    "20, 7.25, 44.97",
    "25, 8.38, 49.39",
    "30, 9.56, 52.33",
    "40, 11.99, 55.43",
    "50, 14.41, 56.40",
    "60, 16.77, 56.23",
    "70, 19.04, 55.40",
    "80, 21.19, 54.19",
    "90, 23.22, 52.77",
    "100, 25.11, 51.22",
    "150, 32.72, 43.35"
  })
  void artificialMainsNetworkToOneHundredFiftyKilohertz(double khz, double ohm, double degrees) {
    double hz = khz * 1e3;
    Curve curve = Curve.of(MAINS_LOW, hz);
    Complex branch = series(l(hz, 50e-6), r(5));
    same(curve.z("device", "bare")[0], branch);
    Complex z = curve.z("device", "receiver")[0];
    same(z, parallel(r(50), branch));
    assertThat(z.abs()).isCloseTo(ohm, within(TWO_DECIMALS));
    assertThat(ClosedForm.degrees(z)).isCloseTo(degrees, within(TWO_DECIMALS));
  }

  @Test
  void artificialMainsNetworkIsWhatItIsComparedWith() {
    Judged judged = Judged.text(MAINS_LOW);
    assertThat(judged.status()).isEqualTo(Run.KEPT);
    assertThat(judged.worst("receiver", "device", "magnitude within"))
        .isCloseTo(0, within(CLOSED_FORM));
    // Degrees: the same 1e-9 of a radian.
    assertThat(judged.worst("receiver", "device", "phase within"))
        .isCloseTo(0, within(Math.toDegrees(CLOSED_FORM)));
    assertThat(judged.limit("receiver", "device", "phase within").path("bare_verdict").asText())
        .isEqualTo("broken");
  }

  /** CISPR 16-1-2, V-network, 0.15 MHz to 30 MHz: 50 Ω ∥ 50 µH; from memory, and the formula. */
  @ParameterizedTest
  @CsvSource({"0.15, 34.29, 46.70", "0.5, 47.64, 17.66", "1, 49.38, 9.04", "10, 49.99, 0.91"})
  void artificialMainsNetworkToThirtyMegahertz(double mhz, double ohm, double degrees) {
    double hz = mhz * 1e6;
    Complex z =
        Curve.of(
                """
                inductor coil = 50 µH
                wire device -- coil -- ground
                port device = device -- ground
                load receiver shunt device -- ground = 50 Ω
                """,
                hz)
            .z("device", "receiver")[0];
    same(z, parallel(r(50), l(hz, 50e-6)));
    assertThat(z.abs()).isCloseTo(ohm, within(TWO_DECIMALS));
    assertThat(ClosedForm.degrees(z)).isCloseTo(degrees, within(TWO_DECIMALS));
  }

  /** IEC 60990, figure 4: published values; the impedances by the formula, to their last digit. */
  @ParameterizedTest
  @CsvSource({
    "20, 1998.39",
    "50, 1990.02",
    "100, 1961.01",
    "1e3, 972.53",
    "10e3, 485.43",
    "100e3, 476.28"
  })
  void touchCurrentNetwork(double hz, double ohm) {
    Complex z = Curve.bare(TOUCH, hz)[0];
    same(z, touch(hz, c(hz, 22e-9)));
    assertThat(z.abs()).isCloseTo(ohm, within(0.005 + 1e-9));
  }

  @Test
  void touchCurrentMeterChangesThePortAtMainsFrequency() {
    double hz = 50;
    Complex loaded = touch(hz, parallel(c(hz, 22e-9), r(1e6), c(hz, 200e-12)));
    double expected = ClosedForm.change(loaded, touch(hz, c(hz, 22e-9)));
    double worst =
        Judged.text(TOUCH + "limit change 1 % at 50 Hz\n").worst("meter", "hand", "change");
    // A change of 1e-4 keeps 1e-12 of a double's digits in the plain difference above.
    assertThat(worst).isCloseTo(expected, within(CLOSED_FORM * expected));
    assertThat(worst).isCloseTo(0.00012, within(0.000005));
  }

  private static final String TOUCH =
      """
      resistor skin = 1500 Ω
      capacitor skin_c = 0.22 µF
      resistor body = 500 Ω
      resistor weight = 10 kΩ
      capacitor weight_c = 22 nF
      wire hand -- skin -- inner -- body -- ground
      wire hand -- skin_c -- inner
      wire inner -- weight -- output -- weight_c -- ground
      port hand = hand -- ground
      load meter shunt output -- ground = 1 MΩ || 200 pF
      """;

  private static Complex touch(double hz, Complex output) {
    return series(parallel(r(1500), c(hz, 0.22e-6)), parallel(r(500), series(r(10e3), output)));
  }

  /** IEEE 802.3, clause 33: 23.75 kΩ to 26.25 kΩ and 0.05 µF to 0.12 µF; published. */
  @ParameterizedTest
  @CsvSource({
    "24.9 kΩ, 0.1 µF, kept, kept",
    "23.75 kΩ, 0.05 µF, kept, kept",
    "26.25 kΩ, 0.12 µF, kept, kept",
    "23.74 kΩ, 0.1 µF, broken, kept",
    "26.26 kΩ, 0.1 µF, broken, kept",
    "24.9 kΩ, 0.0499 µF, kept, broken",
    "24.9 kΩ, 0.1201 µF, kept, broken",
    "12 kΩ, 0.2 µF, broken, broken"
  })
  void poweredDeviceSignature(String ohm, String farad, String resistance, String capacitance) {
    Judged judged =
        Judged.text(
            """
            resistor r = %s
            capacitor c = %s
            wire a -- r -- ground
            wire a -- c -- ground
            port pair = a -- ground
            sweep 1 Hz to 1 kHz
            limit parallel resistance 23.75 kΩ to 26.25 kΩ
            limit parallel capacitance 0.05 µF to 0.12 µF
            """
                .formatted(ohm, farad));
    assertThat(judged.limit("bare", "pair", "parallel resistance").path("verdict").asText())
        .isEqualTo(resistance);
    assertThat(judged.limit("bare", "pair", "parallel capacitance").path("verdict").asText())
        .isEqualTo(capacitance);
  }

  /** IEC 60062 letter codes: the standard's own examples. */
  @ParameterizedTest
  @CsvSource({
    "resistor, R47, 0.47",
    "resistor, 4R7, 4.7",
    "resistor, 470R, 470",
    "resistor, 4K7, 4700",
    "resistor, 4k7, 4700",
    "resistor, 47K3, 47300",
    "resistor, 4M7, 4.7e6",
    "resistor, 1M0, 1e6",
    "capacitor, 4n7, 4.7e-9",
    "capacitor, p33, 0.33e-12",
    "capacitor, 1µ0, 1e-6",
    "capacitor, 47µ, 47e-6",
    "inductor, 2u2, 2.2e-6"
  })
  void letterCodes(String part, String code, double value) {
    double hz = 1e3;
    String text = part + " x = " + code + "\nwire a -- x -- ground\nport p = a -- ground\n";
    Complex expected =
        switch (part) {
          case "resistor" -> r(value);
          case "capacitor" -> c(hz, value);
          default -> l(hz, value);
        };
    same(Curve.bare(text, hz)[0], expected);
  }

  /** 1/(f·C): 10 pF at 100 kS/s is 1 MΩ; textbook. */
  @Test
  void switchedCapacitorAsAResistor() {
    String text =
        """
        let rate = 100 kHz
        resistor equal = 1 / (rate * 10 pF)
        wire a -- equal -- ground
        port p = a -- ground
        """;
    same(Curve.bare(text, 1)[0], r(1e6));
  }

  private static void same(Complex actual, Complex expected) {
    assertThat(ClosedForm.apart(actual, expected))
        .as("%s against %s", actual, expected)
        .isLessThanOrEqualTo(CLOSED_FORM);
  }
}
