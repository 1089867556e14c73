package loadmark.report;

import static org.assertj.core.api.Assertions.assertThat;

import loadmark.network.Band;
import loadmark.response.Ohms;
import org.junit.jupiter.api.Test;

class ImpedancesTest {
  @Test
  void polarAndRectangularFormHaveFourDigits() {
    Ohms z = Ohms.of(3000, -4000);
    assertThat(Impedances.polar(z)).isEqualTo("5.000 kΩ ∠ -53.13°");
    assertThat(Impedances.rectangular(z)).isEqualTo("3.000 kΩ - j4.000 kΩ");
  }

  @Test
  void openZeroAndUndeterminedAreWords() {
    assertThat(Impedances.polar(Ohms.OPEN)).isEqualTo("open");
    assertThat(Impedances.polar(Ohms.UNDETERMINED)).isEqualTo("undetermined");
    assertThat(Impedances.polar(Ohms.of(0, 0))).isEqualTo("0 Ω");
    assertThat(Impedances.rectangular(Ohms.OPEN)).isEmpty();
  }

  @Test
  void smallPhasesEndAtFourDecimals() {
    assertThat(Impedances.phase(Ohms.of(1, 1e-12))).isEqualTo("0°");
    assertThat(Impedances.phase(Ohms.of(1e6, 1))).isEqualTo("0.0001°");
    assertThat(Impedances.phase(Ohms.of(-1, 0))).isEqualTo("180.0°");
  }

  @Test
  void bandEndsAreToldApart() {
    assertThat(Impedances.band(new Band(10, 1e6))).isEqualTo("10 Hz to 1 MHz");
    assertThat(Impedances.band(new Band(31620.1, 31620.4))).isEqualTo("31.6201 kHz to 31.6204 kHz");
    assertThat(Impedances.band(Band.at(5000))).isEqualTo("5 kHz");
    assertThat(Impedances.band(Band.DC)).isEqualTo("DC");
  }
}
