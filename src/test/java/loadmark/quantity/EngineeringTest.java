package loadmark.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EngineeringTest {

  @ParameterizedTest
  @CsvSource({
    "220000,Ω,220 kΩ,220.0 kΩ",
    "4.7e-9,F,4.7 nF,4.700 nF",
    "1e6,Hz,1 MHz,1.000 MHz",
    "0.02,Ω,20 mΩ,20.00 mΩ",
    "999.96,Ω,1 kΩ,1.000 kΩ",
    "999.94,Ω,999.9 Ω,999.9 Ω",
    "-1234.5,Ω,-1.234 kΩ,-1.234 kΩ",
    "1.2e-20,Ω,1.2e-20 Ω,1.200e-20 Ω",
    "1e15,Ω,1e15 Ω,1.000e15 Ω",
    "9.99996e14,Ω,1e15 Ω,1.000e15 Ω",
    "1e-15,F,1 fF,1.000 fF",
    "1e14,Ω,100 TΩ,100.0 TΩ",
    "0,Ω,0 Ω,0 Ω",
    "Infinity,Ω,∞ Ω,∞ Ω",
    "-Infinity,Ω,-∞ Ω,-∞ Ω",
  })
  void prefixAndDigitsFollowTheValue(double value, String unit, String input, String result) {
    assertThat(Engineering.input(value, unit)).isEqualTo(input);
    assertThat(Engineering.result(value, unit)).isEqualTo(result);
  }

  @Test
  void moreDigitsOnDemand() {
    assertThat(Engineering.result(2.000000123e5, "Ω", 9)).isEqualTo("200.000012 kΩ");
    assertThat(Engineering.plain(20.04999, "dB", 3)).isEqualTo("20.0 dB");
    assertThat(Engineering.plain(0.5, "", 2)).isEqualTo("0.50");
  }

  @Test
  void percentAndDegrees() {
    assertThat(Engineering.percent(0.02)).isEqualTo("2 %");
    assertThat(Engineering.percent(0.07)).isEqualTo("7 %");
    assertThat(Engineering.percent(0.012344, 4)).isEqualTo("1.234 %");
    assertThat(Engineering.degrees(11.5)).isEqualTo("11.5°");
    assertThat(Engineering.degrees(-0.25, 3)).isEqualTo("-0.250°");
    assertThat(Engineering.percent(Double.POSITIVE_INFINITY)).isEqualTo("∞ %");
  }

  @Test
  void notANumberIsTheCallersMistake() {
    assertThatThrownBy(() -> Engineering.result(Double.NaN, "Ω"))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Engineering.exact(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @ParameterizedTest
  @CsvSource({
    "10,10", "1e6,1e6", "0.02,0.02", "4.7e-9,4.7e-9", "1234567.5,1234567.5", "100000,100000",
    "0.0001,0.0001", "0.00001,1e-5", "-2.5,-2.5", "0,0", "2e23,2e23",
        "1.7976931348623157e308,1.7976931348623157e308",
  })
  void exactIsTheShortestForm(double value, String text) {
    assertThat(Engineering.exact(value)).isEqualTo(text);
  }

  /** Double.toString writes the smallest double as 4.9E-324; 5e-324 reads back the same. */
  @Test
  void exactIsNoLongerThanItMustBe() {
    assertThat(Engineering.exact(2.2250738585072014e-308)).isEqualTo("2.2250738585072014e-308");
    assertThat(Engineering.exact(Double.MIN_VALUE)).isEqualTo("5e-324");
    assertThat(Engineering.exact(2e-3)).isEqualTo("0.002");
  }

  @Test
  void exactReadsBackTheSameDouble() {
    long seed = 20260101;
    Random random = new Random(seed);
    for (int i = 0; i < 20_000; i++) {
      double value = Double.longBitsToDouble(random.nextLong());
      if (Double.isFinite(value)) {
        String text = Engineering.exact(value);
        assertThat(Double.parseDouble(text)).as("seed %d: %s", seed, text).isEqualTo(value);
      }
    }
  }

  @Test
  void defaultLocaleHasNoSay() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      assertThat(Engineering.result(4700.5, "Ω")).isEqualTo("4.700 kΩ");
      assertThat(Engineering.exact(0.5)).isEqualTo("0.5");
    } finally {
      Locale.setDefault(before);
    }
  }
}
