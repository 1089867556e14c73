package loadmark.binding;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Sweep;
import org.junit.jupiter.api.Test;

/** Sweep, cases and limits as bound. */
class JudgedTest {
  private static Network network(String... lines) {
    return Binding.withWarnings(all(lines));
  }

  private static List<String> findings(String... lines) {
    return Binding.findings(all(lines));
  }

  private static String[] all(String... lines) {
    return new String[] {
      "resistor r = 1 kΩ",
      "wire a -- r -- ground",
      "port p = a -- ground",
      "load u shunt a -- ground = 1 MΩ",
      "load v shunt a -- ground = 2 MΩ",
      "load w shunt a -- ground = 3 MΩ",
      String.join("\n", lines),
    };
  }

  private static String describe(Case one) {
    return one.name() + ": " + names(one.loads()) + " against " + names(one.against());
  }

  private static List<String> names(List<Load> loads) {
    return loads.stream().map(Load::name).toList();
  }

  private static Limit only(Network network) {
    assertThat(network.limits()).hasSize(1);
    return network.limits().get(0);
  }

  @Test
  void withoutCasesEachLoadIsJudgedAloneThenAllTogether() {
    assertThat(
            network("sweep 1 Hz to 1 kHz", "limit change 1 %").cases().stream()
                .map(c -> describe(c)))
        .containsExactly(
            "u: [u] against []",
            "v: [v] against []",
            "w: [w] against []",
            "all: [u, v, w] against []");
  }

  @Test
  void aCaseSaysWhatIsOnAndWhatItIsHeldAgainst() {
    assertThat(
            network(
                    "sweep 1 Hz to 1 kHz",
                    "limit change 1 %",
                    "case each = v, w",
                    "case both = u, v",
                    "case more = u added to v, w",
                    "case other = u, v instead of w")
                .cases()
                .stream()
                .map(c -> describe(c)))
        .containsExactly(
            "v: [v] against []",
            "w: [w] against []",
            "both: [u, v] against []",
            "more: [u, v, w] against [v, w]",
            "other: [u, v] against [w]");
  }

  @Test
  void aSweepHasEqualStepsAndNeverFewerThanFiftyPoints() {
    String limit = "limit change 1 %";
    assertThat(network("sweep 10 Hz to 1 MHz", limit).sweep())
        .contains(new Sweep(false, Optional.of(new Band(10, 1e6)), 101, 7));
    assertThat(network("sweep dc and 10 Hz to 1 MHz, 50 per decade", limit).sweep())
        .contains(new Sweep(true, Optional.of(new Band(10, 1e6)), 251, 7));
    assertThat(network("sweep 1k to 2k", limit).sweep().orElseThrow().points()).isEqualTo(50);
    assertThat(network("sweep 1k to 2k, 400 points", limit).sweep().orElseThrow().points())
        .isEqualTo(400);
    assertThat(network("sweep dc", limit).sweep().orElseThrow().band()).isEmpty();
    assertThat(findings("sweep 1k to 2k, 30 points", limit)).containsExactly("7:17 few-points");
  }

  @Test
  void aScopeIsCutToTheSweep() {
    assertThat(only(network("sweep dc and 10 Hz to 1 kHz", "limit change 1 %")).scope())
        .containsExactly(Band.DC, new Band(10, 1e3));
    assertThat(
            only(network("sweep 10 Hz to 1 kHz", "limit change 1 % from 100 Hz to 1 MHz")).scope())
        .containsExactly(new Band(100, 1e3));
    assertThat(only(network("limit change 1 % at 5 kHz, 1 kHz, dc")).scope())
        .containsExactly(Band.DC, Band.at(1e3), Band.at(5e3));
    assertThat(findings("sweep 10 Hz to 1 kHz", "limit change 1 % from 100 Hz to 1 MHz"))
        .containsExactly("8:18 scope-cut");
    assertThat(findings("sweep 10 Hz to 1 kHz", "limit change 1 % at 5 kHz"))
        .containsExactly("8:18 scope-outside-sweep");
    assertThat(findings("sweep 10 Hz to 1 kHz", "limit change 1 % at dc"))
        .containsExactly("8:18 scope-outside-sweep");
    assertThat(findings("limit change 1 %")).containsExactly("7:1 no-sweep");
  }

  @Test
  void everyKindOfLimitKeepsItsBound() {
    Network network =
        network(
            "sweep 10 Hz to 1 kHz",
            "limit change 5 Ω or 2 %",
            "limit magnitude 50 Ω ± 20 %",
            "limit phase -10 deg to 11.5 deg",
            "limit within 20 %, 11.5 deg of 50 Ω || 50 µH",
            "limit return loss 20 dB in 50 Ω");
    assertThat(network.limits().stream().map(Limit::criterion))
        .containsExactly(
            Criterion.CHANGE,
            Criterion.MAGNITUDE,
            Criterion.PHASE,
            Criterion.MAGNITUDE_WITHIN,
            Criterion.PHASE_WITHIN,
            Criterion.RETURN_LOSS);
    assertThat(network.limits().stream().map(Limit::bound))
        .containsExactly(
            new Bound(OptionalDouble.empty(), OptionalDouble.of(0.02), OptionalDouble.of(5)),
            Bound.between(40, 60),
            Bound.between(-10, 11.5),
            Bound.atMost(0.2),
            Bound.atMost(11.5),
            Bound.atLeast(20));
    assertThat(network.limits().get(3).referenceText()).isEqualTo("50 Ω || 50 µH");
  }

  @Test
  void aLimitThatCannotBeMeantIsRefused() {
    String sweep = "sweep 10 Hz to 1 kHz";
    assertThat(findings(sweep, "limit change 2")).containsExactly("8:14 missing-unit");
    assertThat(findings(sweep, "limit change 1 Ω or 2 Ω")).containsExactly("8:21 wrong-dimension");
    assertThat(findings(sweep, "limit magnitude 5 Ω to 4 Ω")).containsExactly("8:17 window-order");
    assertThat(findings(sweep, "limit phase -200 deg to 200 deg"))
        .containsExactly("8:13 out-of-range");
    assertThat(findings(sweep, "limit change 1 % for case bare"))
        .containsExactly("8:27 unknown-case");
    assertThat(findings(sweep, "limit change 1 % for case x at port q"))
        .containsExactly("8:27 unknown-case", "8:37 unknown-port");
  }

  @Test
  void aNetworkWithoutLoadsIsJudgedBare() {
    Network network =
        Binding.of(
            "resistor r = 1 kΩ",
            "wire a -- r -- ground",
            "port p = a -- ground",
            "sweep 10 Hz to 1 kHz",
            "limit magnitude above 1 Ω");
    assertThat(network.cases().stream().map(Case::name)).containsExactly("bare");
    assertThat(only(network).cases().get(0).isBare()).isTrue();
  }
}
