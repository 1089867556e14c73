package loadmark.binding;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.OnePort.Element;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.OnePort.Parallel;
import loadmark.network.OnePort.Series;
import loadmark.network.Value;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PartValuesTest {
  private static OnePort value(String statement, String... before) {
    Network network =
        Binding.of(
            String.join("\n", before),
            statement,
            "wire a -- x -- ground",
            "port p = a -- ground",
            "sweep 1 kHz to 1 MHz",
            "limit magnitude above 1 Ω");
    return Binding.part(network, "x").value();
  }

  private static List<String> findings(String statement) {
    return Binding.findings(
        statement,
        "wire a -- x -- ground",
        "port p = a -- ground",
        "sweep 1 kHz to 1 MHz",
        "limit magnitude above 1 Ω");
  }

  private static Element element(ElementKind kind, double value) {
    return new Element(kind, Value.exact(value));
  }

  // Letter codes: IEC 60062. The value is the double nearest to the decimal number.
  @ParameterizedTest
  @CsvSource({
    "resistor x = 4K7, RESISTANCE, 4.7e3",
    "resistor x = 4k7, RESISTANCE, 4.7e3",
    "resistor x = R47, RESISTANCE, 0.47",
    "resistor x = 2R2, RESISTANCE, 2.2",
    "resistor x = 1M0, RESISTANCE, 1e6",
    "resistor x = 470K, RESISTANCE, 470e3",
    "resistor x = 220k, RESISTANCE, 220e3",
    "resistor x = 10m, RESISTANCE, 10e-3",
    "resistor x = 47, RESISTANCE, 47",
    "resistor x = 0, RESISTANCE, 0",
    "capacitor x = 4n7, CAPACITANCE, 4.7e-9",
    "capacitor x = p33, CAPACITANCE, 0.33e-12",
    "capacitor x = 47µ, CAPACITANCE, 47e-6",
    "inductor x = 2u2, INDUCTANCE, 2.2e-6",
    "inductor x = 10 µH, INDUCTANCE, 10e-6",
    "impedance x = 2 mS, CONDUCTANCE, 2e-3",
    "capacitor x = 1 ms / 1 kΩ, CAPACITANCE, 1e-6",
    "resistor x = sqrt(1 mH / 1 nF), RESISTANCE, 1e3",
  })
  void aValueIsReadToTheLastDigit(String statement, ElementKind kind, double value) {
    if (kind == ElementKind.RESISTANCE && value == 0) {
      assertThat(findings(statement)).containsExactly("3:10 port-shorted");
    } else {
      assertThat(value(statement)).isEqualTo(element(kind, value));
    }
  }

  @Test
  void aToleranceBelongsToTheWholeOfAPartsValue() {
    assertThat(value("resistor x = 99 Ω + 1 Ω ± 1 %"))
        .isEqualTo(new Element(ElementKind.RESISTANCE, new Value(100, 99, 101)));
    assertThat(value("capacitor x = 100 pF, tolerance -20 % to +80 %"))
        .isEqualTo(
            new Element(ElementKind.CAPACITANCE, new Value(100e-12, 100e-12 * 0.8, 180e-12)));
    assertThat(value("capacitor x = 10 pF ± 0.5 pF"))
        .isEqualTo(new Element(ElementKind.CAPACITANCE, new Value(10e-12, 9.5e-12, 10.5e-12)));
  }

  @Test
  void inAnImpedanceATolerancesBelongsToTheQuantityBeforeIt() {
    assertThat(value("impedance x = 10 Ω ± 10 % || 1 nF + 5 Ω"))
        .isEqualTo(
            new Series(
                List.of(
                    new Parallel(
                        List.of(
                            new Element(ElementKind.RESISTANCE, new Value(10, 9, 11)),
                            element(ElementKind.CAPACITANCE, 1e-9))),
                    element(ElementKind.RESISTANCE, 5))));
  }

  @Test
  void propertiesStandWhereTheyDoInTheRealPart() {
    Element r = element(ElementKind.RESISTANCE, 1e3);
    Element c = element(ElementKind.CAPACITANCE, 1e-12);
    Element l = element(ElementKind.INDUCTANCE, 1e-9);
    assertThat(value("resistor x = 1 kΩ, parallel capacitance 1 pF, series inductance 1 nH"))
        .isEqualTo(new Parallel(List.of(new Series(List.of(r, l)), c)));
    assertThat(value("capacitor x = 1 pF, series resistance 1 kΩ, series inductance 1 nH"))
        .isEqualTo(new Series(List.of(c, r, l)));
    assertThat(value("capacitor x = 1 pF, leakage 1 kΩ")).isEqualTo(new Parallel(List.of(c, r)));
  }

  // C = 1/((2πf)²L), the resonance of L and C: textbook.
  @Test
  void aSelfResonanceGivesTheParallelCapacitance() {
    double omega = 2 * Math.PI * 30e6;
    assertThat(value("inductor x = 10 µH, self-resonance 30 MHz"))
        .isEqualTo(
            new Parallel(
                List.of(
                    element(ElementKind.INDUCTANCE, 10e-6),
                    element(ElementKind.CAPACITANCE, 1 / (omega * omega * 10e-6)))));
  }

  @Test
  void aCodeThatBeginsWithALetterIsDoubtfulWhereSomethingHasThatName() {
    assertThat(
            Binding.findings(
                "let R47 = 3 Ω",
                "resistor x = R47",
                "wire a -- x -- ground",
                "port p = a -- ground",
                "sweep 1 kHz to 1 MHz",
                "limit magnitude above 1 Ω"))
        .containsExactly("2:14 letter-code");
  }

  @ParameterizedTest
  @CsvSource({
    "resistor x = 4.7 nF, 1:14 wrong-dimension",
    "resistor x = 470 KΩ, 1:18 wrong-prefix",
    "resistor x = 470 K, 1:18 wrong-prefix",
    "resistor x = 4.7 kF, 1:14 wrong-dimension",
    "capacitor x = 0 F, 1:15 out-of-range",
    "capacitor x = -5 pF, 1:15 out-of-range",
    "capacitor x = 4K7, 1:15 letter-code",
    "resistor x = 1e400 Ω, 1:14 out-of-range",
    "resistor x = 1 kΩ ± 200 %, 1:21 tolerance",
    "resistor x = 1 kΩ ± 1, 1:21 tolerance",
    "resistor x = 1 kΩ || 2 kΩ, 1:19 impedance-arithmetic",
    "impedance x = 1 kΩ - 2 Ω, 1:20 impedance-arithmetic",
    "impedance x = 4K7, 1:15 letter-code",
    "impedance x = 5 V, 1:15 wrong-dimension",
    "resistor x = y, 1:14 undefined-value",
    "resistor x = 2 * 10k, 1:14 wrong-dimension",
    "resistor x = 1 kΩ + 1 nF, 1:19 wrong-dimension",
    "resistor x = 20 dB * 1 Ω, 1:20 arithmetic",
  })
  void aSlipInAValueIsFoundWhereItStands(String statement, String finding) {
    assertThat(findings(statement)).containsExactly(finding);
  }
}
