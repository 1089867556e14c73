package loadmark.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Codes and values from IEC 60062 (R47, 4R7, 470R, 4K7, 47K3, 4M7, 4n7, p33, 1µ0). */
class LetterCodeTest {

  @ParameterizedTest
  @CsvSource({
    "R47,0.47",
    "4R7,4.7",
    "470R,470",
    "4K7,4700",
    "4k7,4700",
    "47K3,47300",
    "470K,470000",
    "1M0,1e6",
    "4M7,4.7e6",
    "2R2,2.2",
    "1G0,1e9",
    "1T0,1e12",
  })
  void resistorCodesAreExactResistances(String code, double ohm) {
    LetterCode read = LetterCode.find(code).orElseThrow();
    assertThat(read.value()).isEqualTo(ohm);
    assertThat(read.dimensions()).containsExactly(Dimension.RESISTANCE);
  }

  @ParameterizedTest
  @CsvSource({"4n7,4.7e-9", "47µ,47e-6", "2u2,2.2e-6", "1µ0,1e-6", "33n,33e-9"})
  void nanoAndMicroAreCapacitancesOrInductances(String code, double value) {
    LetterCode read = LetterCode.find(code).orElseThrow();
    assertThat(read.value()).isEqualTo(value);
    assertThat(read.dimensions())
        .containsExactlyInAnyOrder(Dimension.CAPACITANCE, Dimension.INDUCTANCE);
  }

  @Test
  void picoIsACapacitance() {
    LetterCode read = LetterCode.find("p33").orElseThrow();
    assertThat(read.value()).isEqualTo(0.33e-12);
    assertThat(read.dimensions()).containsExactly(Dimension.CAPACITANCE);
    assertThat(read.letterFirst()).isTrue();
  }

  @Test
  void milliIsAnyOfTheThree() {
    assertThat(LetterCode.find("4m7").orElseThrow().dimensions()).hasSize(3);
    assertThat(LetterCode.find("4m7").orElseThrow().letterFirst()).isFalse();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "R", "K", "47", "470 K", "470KΩ", "4K7R", "4.7K", "KK", "x47", "-4K7"})
  void whatIsNoCodeIsNotFound(String text) {
    assertThat(LetterCode.find(text)).isEmpty();
  }
}
