package loadmark.evidence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.Test;

/** How heavy a load may be, against closed forms by the rules of series and parallel. */
class AllowanceLawsTest {
  /** What the tool promises for its values, relative; the closed forms are exact. */
  private static final double PROMISE = 1e-9;

  private static final String SOURCE =
      """
      resistor source = 5 kΩ
      wire tap -- source -- ground
      port tap = tap -- ground
      load converter shunt tap -- ground = 250 kΩ
      load probe shunt tap -- ground = 1 MΩ
      sweep 10 Hz to 1 kHz
      limit change 2.5 %
      """;

  private static void is(JsonNode actual, double expected) {
    assertThat(actual.isNumber()).as(actual.toString()).isTrue();
    assertThat(actual.asDouble()).isCloseTo(expected, within(PROMISE * expected));
  }

  @Test
  void theOtherLoadsOfACaseTakeTheirShareOfTheLimitFirst() {
    // |Z_with/5 kΩ − 1| = 2.5 %: G = (1/0.975 − 1)/5 kΩ in all, less 1/250 kΩ. 886.4 kΩ.
    double expected = 1 / ((1 / 0.975 - 1) / 5e3 - 1 / 250e3);
    assertThat(expected).isCloseTo(886e3, within(1e3));
    Allowed allowed = Allowed.text(SOURCE);
    is(allowed.change("tap", "all", "probe", "resistance_ohm", 10), expected);
    is(allowed.all("tap", "all", "probe").path("heaviest_multiple"), 1e6 / expected);
    is(allowed.all("tap", "all", "probe").path("resistance_ohm"), expected);
    assertThat(allowed.all("tap", "all", "probe").path("stopped_by").asInt()).isEqualTo(7);
  }

  @Test
  void addedToTheOthersTheLoadHasTheWholeLimit() {
    // 1 − Z_with/Z_without = Z_s/(R + Z_s) = 2.5 % of Z_s = 5 kΩ || 250 kΩ: R = 39·Z_s, 191.2 kΩ.
    double expected = 39 / (1 / 5e3 + 1 / 250e3);
    Allowed allowed = Allowed.text(SOURCE + "case added = probe added to converter\n");
    is(allowed.change("tap", "added", "probe", "resistance_ohm", 10), expected);
    is(allowed.all("tap", "added", "probe").path("resistance_ohm"), expected);
  }

  @Test
  void aPureCapacitorBesideAResistorIsBoundByTheRightTriangle() {
    // Y/(1/R) − 1 = jωRC = x: |1/(1 + jx) − 1| = x/√(1 + x²) = γ: x = γ/√(1 − γ²).
    double x = 0.025 / Math.sqrt(1 - 0.025 * 0.025);
    Allowed allowed = Allowed.text(SOURCE);
    double expected = x / (2 * Math.PI * 1e3 * 5e3);
    is(allowed.change("tap", "probe", "probe", "capacitance_f", 1e3), expected);
    // Any phase: |1 + Z_L/R| ≥ 1/γ is hardest to keep at Z_L = R/γ·… along +R: |Z_L| = R(1/γ + 1)
    // would be needed against −R alone, which is not passive; on the imaginary axis √(1/γ² − 1).
    is(
        allowed.change("tap", "probe", "probe", "magnitude_ohm", 1e3),
        5e3 * Math.sqrt(1 / (0.025 * 0.025) - 1));
  }

  @Test
  void aSeriesResistorMayBeTheLimitTimesTheLoop() {
    String loop =
        """
        resistor a = 300 Ω
        resistor b = 700 Ω
        wire in -- a -- cut
        wire joint -- b -- ground
        port in = in -- ground
        load meter series cut -- joint = 25 Ω
        sweep 10 Hz to 1 kHz
        limit change 1 %
        """;
    Allowed allowed = Allowed.text(loop);
    is(allowed.change("in", "meter", "meter", "resistance_ohm", 10), 10);
    is(allowed.change("in", "meter", "meter", "magnitude_ohm", 10), 10);
    is(allowed.change("in", "meter", "meter", "inductance_h", 1e3), 10 / (2 * Math.PI * 1e3));
    is(allowed.all("in", "meter", "meter").path("heaviest_multiple"), 0.4);
    is(allowed.all("in", "meter", "meter").path("resistance_ohm"), 10);
    // A capacitor in series, R open: |1/(ωC)| ≤ 10 Ω at 10 Hz; beside 25 Ω it must bridge them:
    // |25/(1 + jx)| = 10, x = ωRC = √(2.5² − 1).
    is(
        allowed.all("in", "meter", "meter").path("capacitance_f"),
        Math.sqrt(2.5 * 2.5 - 1) / (2 * Math.PI * 10 * 25));
  }

  @Test
  void severalSeriesLoadsAtOnePlaceAddUp() {
    String loop =
        """
        resistor a = 1 kΩ
        wire in -- a -- cut
        port in = in -- ground
        load first series cut -- ground = 4 Ω
        load second series ground -- cut = 1 Ω
        sweep 10 Hz to 1 kHz
        limit change 1 %
        """;
    Allowed allowed = Allowed.text(loop);
    is(allowed.all("in", "all", "second").path("resistance_ohm"), 6);
    is(allowed.all("in", "all", "first").path("heaviest_multiple"), 9.0 / 4);
    is(allowed.change("in", "all", "second", "magnitude_ohm", 10), 6);
    is(allowed.change("in", "first", "first", "resistance_ohm", 10), 10);
  }

  @Test
  void theEasierOfTwoBoundsCounts() {
    // 2 % of 5 kΩ is 100 Ω; 250 Ω is easier: Z_with = 4750 Ω, so R = 5 kΩ·4750/250.
    String easier = SOURCE.replace("2.5 %", "2 % or 250 Ω");
    Allowed allowed = Allowed.text(easier);
    is(allowed.change("tap", "probe", "probe", "resistance_ohm", 10), 95e3);
    is(allowed.all("tap", "probe", "probe").path("resistance_ohm"), 95e3);
  }

  @Test
  void theTightestOfSeveralLimitsCountsInItsOwnScope() {
    String two = SOURCE + "limit change 1 % from 100 Hz to 1 kHz\n";
    Allowed allowed = Allowed.text(two);
    is(allowed.change("tap", "probe", "probe", "resistance_ohm", 10), 39 * 5e3);
    is(allowed.change("tap", "probe", "probe", "resistance_ohm", 1e3), 99 * 5e3);
    is(allowed.all("tap", "probe", "probe").path("resistance_ohm"), 99 * 5e3);
    assertThat(allowed.all("tap", "probe", "probe").path("stopped_by").asInt()).isEqualTo(8);
  }

  @Test
  void outsideEveryScopeAnythingGoes() {
    String elsewhere = SOURCE.replace("2.5 %", "2.5 % from 100 Hz to 1 kHz");
    Allowed allowed = Allowed.text(elsewhere);
    for (String column : new String[] {"magnitude_ohm", "resistance_ohm", "capacitance_f"}) {
      assertThat(allowed.change("tap", "probe", "probe", column, 10).asText()).isEqualTo("any");
      assertThat(allowed.change("tap", "probe", "probe", column, 100).isNumber()).isTrue();
    }
  }

  @Test
  void aLimitAtOneFrequencyIsToldThere() {
    String at = SOURCE.replace("2.5 %", "2.5 % at 123 Hz");
    is(Allowed.text(at).change("tap", "probe", "probe", "resistance_ohm", 123), 39 * 5e3);
  }

  @Test
  void whatIsBrokenWithoutTheLoadLeavesRoomForNone() {
    String broken = SOURCE.replace("250 kΩ", "100 kΩ");
    Allowed allowed = Allowed.text(broken);
    assertThat(allowed.all("tap", "all", "probe").path("heaviest_multiple").asText())
        .isEqualTo("none");
    assertThat(allowed.all("tap", "all", "probe").path("stopped_by").asInt()).isEqualTo(7);
    assertThat(allowed.change("tap", "all", "probe", "resistance_ohm", 10).asText())
        .isEqualTo("none");
  }

  @Test
  void aLoadBehindAShortMayBeAnything() {
    String behind = SOURCE.replace("probe shunt tap -- ground", "probe shunt rail -- ground");
    Allowed allowed =
        Allowed.text(behind + "supply rail = 5 V\nresistor r = 1 MΩ\nwire rail -- r -- tap\n");
    JsonNode all = allowed.all("tap", "probe", "probe");
    assertThat(all.path("heaviest_multiple").asText()).isEqualTo("any");
    assertThat(all.has("stopped_by")).isFalse();
    assertThat(all.path("resistance_ohm").asText()).isEqualTo("any");
    assertThat(allowed.change("tap", "probe", "probe", "magnitude_ohm", 10).asText())
        .isEqualTo("any");
  }

  @Test
  void theFirstBreachCountsThoughHeavierLoadsAreKeptAgain() {
    // 1 kΩ in series with an inductor; a capacitor across the port first raises |Z| at resonance
    // and far beyond it lowers it again, so |Z| below 1.2·|Z_0| is kept, broken, kept.
    String resonant =
        """
        resistor r = 100 Ω
        inductor l = 10 mH
        wire in -- r -- m -- l -- ground
        port in = in -- ground
        load c shunt in -- ground = 1 nF
        sweep 9 kHz to 11 kHz
        limit magnitude below 760 Ω at 10 kHz
        """;
    double x = 2 * Math.PI * 1e4 * 10e-3;
    // |Z|² = (r² + x²)/((1 − bx)² + (br)²) = 760²: the smaller root in b = ωC.
    double a = r2(x) + 1e4;
    double root = Math.sqrt(x * x - a * (1 - a / (760.0 * 760)));
    double farad = (x - root) / a / (2 * Math.PI * 1e4);
    is(Allowed.text(resonant).all("in", "c", "c").path("capacitance_f"), farad);
  }

  private static double r2(double x) {
    return x * x;
  }

  @Test
  void anOpenPortAtDcHasNoAllowanceThere() {
    String open =
        """
        capacitor c = 1 µF
        wire in -- c -- ground
        port in = in -- ground
        load probe shunt in -- ground = 10 MΩ
        sweep dc and 1 kHz to 10 kHz
        limit change 1 %
        """;
    Run run = Run.reading(open, "allow", "--format", "json", "-");
    assertThat(run.status()).isEqualTo(Run.INVALID);
    JsonNode change = run.json().path("allowances").path(0).path("change");
    assertThat(change.path("hz").path(0).asDouble()).isZero();
    assertThat(change.path("resistance_ohm").path(0).isNull()).isTrue();
    assertThat(change.path("resistance_ohm").path(1).isNumber()).isTrue();
    // At DC the open port changes by all of it, whatever the resistance.
    JsonNode all = run.json().path("allowances").path(0).path("all_limits");
    assertThat(all.path("heaviest_multiple").asText()).isEqualTo("none");
  }
}
