package loadmark.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnitsTest {

  /** The doubles are Java's own reading of the decimal literal. */
  @ParameterizedTest
  @CsvSource({
    "4.7,nF,4.7e-9",
    "220,kΩ,220000",
    "0.1,mV,1e-4",
    "1.2,MΩ,1.2e6",
    "2,%,0.02",
    "7,%,0.07",
    "20,ppm,2e-5",
    "9,pF,9e-12",
    ".5,µs,5e-7",
    "1e3,kHz,1e6",
    "250,nH/m,250e-9",
    "6,ns/m,6e-9",
    "3.3,fF,3.3e-15",
    "0.3,THz,3e11",
    "5,mV,5e-3",
  })
  void scalingRoundsOnceAsTheDecimalReads(String number, String unit, double value) {
    assertThat(Units.scaled(number, Units.find(unit).orElseThrow())).isEqualTo(value);
  }

  @ParameterizedTest
  @ValueSource(strings = {"kΩ", "k\u2126", "kohm"})
  void everyWayToWriteOhmIsOneUnit(String text) {
    assertThat(Units.find(text)).contains(new Unit(1e3, Dimension.RESISTANCE, "kΩ"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"\u00B5F", "\u03BCF", "uF"})
  void everyWayToWriteMicroIsOneUnit(String text) {
    assertThat(Units.find(text)).contains(new Unit(1e-6, Dimension.CAPACITANCE, "µF"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "k%", "mppm", "kdB", "mdeg", "k°", "klsb", "mc", "KΩ", "Khz", "k", "", "kk", "dF", "cm",
        "F/s", "V/m", "/m", "m/m"
      })
  void whatIsNoUnitIsNotFound(String text) {
    assertThat(Units.find(text)).isEmpty();
  }

  @Test
  void secondIsNotSiemensAndMetreIsNotMega() {
    assertThat(Units.find("ms").orElseThrow().dimension()).isEqualTo(Dimension.TIME);
    assertThat(Units.find("mS").orElseThrow().dimension()).isEqualTo(Dimension.CONDUCTANCE);
    assertThat(Units.find("mm").orElseThrow().factor()).isEqualTo(1e-3);
    assertThat(Units.find("MΩ").orElseThrow().factor()).isEqualTo(1e6);
    assertThat(Units.find("mΩ").orElseThrow().factor()).isEqualTo(1e-3);
  }

  @Test
  void perMetreDividesTheDimensionByLength() {
    assertThat(Units.find("nH/m"))
        .contains(new Unit(1e-9, Dimension.INDUCTANCE.over(Dimension.LENGTH), "nH/m"));
  }

  /** π rad is 180° by definition of the degree; angles are kept in degrees. */
  @Test
  void halfATurnIsAHundredAndEightyDegrees() {
    assertThat(Units.scaled("11.5", Units.find("deg").orElseThrow())).isEqualTo(11.5);
    assertThat(Units.scaled("180", Units.find("°").orElseThrow())).isEqualTo(180);
    assertThat(Units.scaled("1", Units.find("rad").orElseThrow())).isEqualTo(180 / Math.PI);
  }

  @Test
  void tooLargeIsInfiniteAndNeverThrows() {
    Unit ohm = Units.find("Ω").orElseThrow();
    assertThat(Units.scaled("1e400", ohm)).isInfinite();
    assertThat(Units.scaled("1e99999999999", ohm)).isInfinite();
    assertThat(Units.scaled("1e300", Units.find("TΩ").orElseThrow())).isInfinite();
    assertThat(Units.scaled("1e-99999999999", Units.find("kΩ").orElseThrow())).isZero();
  }

  @Test
  void prefixAloneGivesItsFactor() {
    assertThat(Units.findPrefix("k")).hasValue(1e3);
    assertThat(Units.findPrefix("M")).hasValue(1e6);
    assertThat(Units.findPrefix("m")).hasValue(1e-3);
    assertThat(Units.findPrefix("u")).hasValue(1e-6);
    assertThat(Units.findPrefix("K")).isEmpty();
    assertThat(Units.findPrefix("Ω")).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({
    "KHz,kHz",
    "Khz,kHz",
    "khz,kHz",
    "MHZ,MHz",
    "hz,Hz",
    "HZ,Hz",
    "KΩ,kΩ",
    "Kohm,kΩ",
    "kOhm,kΩ",
    "Ohm,Ω",
    "ohms,Ω",
    "farad,F",
    "nf,nF",
    "PF,pF",
    "db,dB",
    "DEG,deg",
    "degrees,deg",
    "nh/m,nH/m",
  })
  void explanationNamesTheUnitThatWasMeant(String text, String meant) {
    assertThat(Units.explain(text).hint()).isEqualTo("write `" + meant + "`");
    assertThat(Units.find(meant)).isPresent();
  }

  @Test
  void capitalKAloneIsToldApart() {
    assertThat(Units.explain("K").hint()).contains("`k`");
  }

  @Test
  void unknownUnitListsTheKnownOnes() {
    assertThat(Units.explain("xyz").hint()).startsWith("units are Ω, F, H");
  }
}
