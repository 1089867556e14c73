package loadmark.judge;

import static loadmark.judge.Formula.judge;
import static loadmark.judge.Formula.limit;
import static loadmark.judge.Formula.omega;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.response.Comparison;
import loadmark.response.Ohms;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

class BandsTest {
  /** What the results promise of edges and worst values. */
  private static final double RELATIVE = 1e-9;

  private static final Band WIDE = new Band(10, 1e6);
  private static final Resonator SHARP = new Resonator(1000, 12_345.678, 1000);

  private static void assertNear(double actual, double expected) {
    assertThat(actual).isCloseTo(expected, within(RELATIVE * Math.abs(expected)));
  }

  private static Limit below(double ohm, Band... scope) {
    return limit(Criterion.MAGNITUDE, Bound.atMost(ohm), scope);
  }

  private static double worst(LimitJudgement judgement) {
    return judgement.worst().orElseThrow().value().orElseThrow();
  }

  /**
   * Series R into C, a load capacitor k·C across C: the change is −k/(1 + k)/(1 + jωRC) (divider
   * rule, closed form).
   */
  private static Comparison lowPass(double tau, double share) {
    return Formula.ofChange(hz -> new Complex(-share).divide(new Complex(1, omega(hz) * tau)));
  }

  @Test
  void capacitiveLoadOnALowPassBreaksUpToAKnownFrequency() {
    double tau = 1e-4;
    double share = 0.1;
    double bound = 0.02;
    LimitJudgement result =
        judge(lowPass(tau, share), limit(Criterion.CHANGE, Bound.atMost(bound), WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.BROKEN);
    assertThat(result.bands()).hasSize(1);
    Band band = result.bands().get(0).band();
    assertThat(band.fromHz()).isEqualTo(10);
    assertNear(band.toHz(), Math.sqrt(Math.pow(share / bound, 2) - 1) / tau / (2 * Math.PI));
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(10);
    assertNear(worst(result), share / Math.hypot(1, omega(10) * tau));
  }

  @Test
  void tinyChangesKeepTheirDigits() {
    double tau = 1e-4;
    double share = 1e-9;
    LimitJudgement result =
        judge(lowPass(tau, share), limit(Criterion.CHANGE, Bound.atMost(5e-10), WIDE));
    assertNear(result.bands().get(0).band().toHz(), Math.sqrt(3) / tau / (2 * Math.PI));
    LimitJudgement kept =
        judge(lowPass(tau, share), limit(Criterion.CHANGE, Bound.atMost(0.02), WIDE));
    assertThat(kept.verdict()).isEqualTo(Verdict.KEPT);
    assertNear(worst(kept), share / Math.hypot(1, omega(10) * tau));
  }

  @Test
  void narrowPeakOfAResonatorIsFoundWithItsEdgesAndHeight() {
    // δ = ±1e-4 at the edges, a relative width of 1e-4: Qδ = 0.1.
    double ratio = Math.sqrt(1.01);
    LimitJudgement result = judge(Formula.alone(SHARP.parallel()), below(1000 / ratio, WIDE));
    assertThat(result.bands()).hasSize(1);
    Band band = result.bands().get(0).band();
    assertNear(band.fromHz(), SHARP.edge(ratio, -1));
    assertNear(band.toHz(), SHARP.edge(ratio, 1));
    assertThat((band.toHz() - band.fromHz()) / SHARP.hz()).isCloseTo(1e-4, within(1e-7));
    assertNear(worst(result), 1000);
  }

  @Test
  void peakBelowTheLimitIsTheWorstPointAndKept() {
    LimitJudgement result = judge(Formula.alone(SHARP.parallel()), below(1001, WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(result.bands()).isEmpty();
    assertNear(worst(result), 1000);
    assertThat(result.method()).isEqualTo(LimitJudgement.Method.SAMPLED);
  }

  @Test
  void touchingPeakIsNoBand() {
    LimitJudgement result = judge(Formula.alone(SHARP.parallel()), below(1000, WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(result.bands()).isEmpty();
  }

  @Test
  void peakWithinTheSlackIsNoBandAndJustBeyondItIs() {
    assertThat(judge(Formula.alone(SHARP.parallel()), below(1000 * (1 - 9e-10), WIDE)).bands())
        .isEmpty();
    assertThat(judge(Formula.alone(SHARP.parallel()), below(1000 * (1 - 1.1e-9), WIDE)).bands())
        .hasSize(1);
  }

  @Test
  void skirtsOfAResonatorAreTwoBandsAndThePeakBetweenIsKept() {
    double ratio = 2;
    Limit above = limit(Criterion.MAGNITUDE, Bound.atLeast(1000 / ratio), WIDE);
    List<BrokenBand> bands = judge(Formula.alone(SHARP.parallel()), above).bands();
    assertThat(bands).hasSize(2);
    assertThat(bands.get(0).band().fromHz()).isEqualTo(10);
    assertNear(bands.get(0).band().toHz(), SHARP.edge(ratio, -1));
    assertNear(bands.get(1).band().fromHz(), SHARP.edge(ratio, 1));
    assertThat(bands.get(1).band().toHz()).isEqualTo(1e6);
  }

  @Test
  void keptGapNarrowerThanTheResonanceSplitsABand() {
    Resonator dip = new Resonator(5, 1e4, 3000);
    List<BrokenBand> bands = judge(Formula.alone(dip.series()), below(5.001, WIDE)).bands();
    assertThat(bands).hasSize(2);
    assertNear(bands.get(0).band().toHz(), dip.edge(1.0002, -1));
    assertNear(bands.get(1).band().fromHz(), dip.edge(1.0002, 1));
  }

  @Test
  void brokenEverywhereIsTheWholeScope() {
    LimitJudgement result = judge(Formula.alone(hz -> Ohms.of(50, 0)), below(40, WIDE));
    assertThat(result.bands()).extracting(BrokenBand::band).containsExactly(WIDE);
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(10);
  }

  @Test
  void constantAtItsBoundIsKeptWhateverRoundingDoes() {
    LimitJudgement result =
        judge(Formula.alone(hz -> Ohms.of(50 * (1 + 1e-15 * Math.sin(hz)), 0)), below(50, WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(10);
  }

  @Test
  void bandAtTheVeryEndSaysTheEnd() {
    // |1 + jωτ|·1 Ω against its value a millionth below the end of the scope.
    double edge = 1e6 * (1 - 1e-6);
    LimitJudgement result =
        judge(Formula.alone(hz -> Ohms.of(1, hz / 1e6)), below(Math.hypot(1, edge / 1e6), WIDE));
    assertThat(result.bands()).hasSize(1);
    assertNear(result.bands().get(0).band().fromHz(), edge);
    assertThat(result.bands().get(0).band().toHz()).isEqualTo(1e6);
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(1e6);
  }

  @Test
  void limitMetExactlyAtTheEndIsKept() {
    LimitJudgement result = judge(Formula.alone(hz -> Ohms.of(hz, 0)), below(1e6, WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(1e6);
  }

  @Test
  void bandsDoNotCrossPiecesOfTheScope() {
    Band first = new Band(10, 100);
    Band second = new Band(200, 1000);
    LimitJudgement result =
        judge(Formula.alone(hz -> Ohms.of(hz, 0)), below(50, first, Band.at(150), second));
    assertThat(result.bands())
        .extracting(BrokenBand::band)
        .containsExactly(result.bands().get(0).band(), Band.at(150), second);
    assertNear(result.bands().get(0).band().fromHz(), 50);
    assertThat(result.bands().get(0).band().toHz()).isEqualTo(100);
    assertThat(worst(result)).isEqualTo(1000);
  }

  @Test
  void directCurrentIsAPointOfItsOwn() {
    Limit limit = below(1.5, Band.DC, WIDE);
    LimitJudgement result =
        judge(Formula.alone(hz -> hz == 0 ? Ohms.of(2, 0) : Ohms.of(1, 0)), limit);
    assertThat(result.bands()).extracting(BrokenBand::band).containsExactly(Band.DC);
    assertThat(result.worst().orElseThrow().hz()).isZero();
  }

  @Test
  void easierOfTwoBoundsOnTheChangeDecidesAtEachFrequency() {
    // Z = f² Ω changed by f Ω: 1/f past 1 % below 100 Hz, f past 50 Ω above 50 Hz; the two excesses
    // are one at f² = 100·50.
    Comparison comparison = Formula.of(f -> Ohms.of(f * f, 0), f -> Ohms.of(f * f + f, 0));
    Limit limit = limit(Criterion.CHANGE, Bound.atMost(0.01).orAtMostOhm(50), WIDE);
    LimitJudgement result = judge(comparison, limit);
    assertThat(result.bands()).hasSize(1);
    assertNear(result.bands().get(0).band().fromHz(), 50);
    assertNear(result.bands().get(0).band().toHz(), 100);
    Worst worst = result.worst().orElseThrow();
    assertNear(worst.hz(), Math.sqrt(5000));
    assertNear(worst.value().orElseThrow(), 1 / Math.sqrt(5000));
    assertNear(worst.valueOhm().orElseThrow(), Math.sqrt(5000));
  }

  @Test
  void losslessResonanceOfTheBarePortIsUnbounded() {
    // Series L and C without, 1 Ω more with: |h| = 1/|X|, X = 1000·δ.
    double f0 = 54_321.9;
    Comparison comparison =
        Formula.of(
            f -> Ohms.of(0, 1000 * ((f - f0) * (f + f0) / (f * f0))),
            f -> Ohms.of(1, 1000 * ((f - f0) * (f + f0) / (f * f0))));
    LimitJudgement result = judge(comparison, limit(Criterion.CHANGE, Bound.atMost(10), WIDE));
    assertThat(result.worst().orElseThrow().value()).isEmpty();
    assertNear(result.worst().orElseThrow().hz(), f0);
    // 1/|X| = 10: δ = ±1e-4.
    assertNear(result.bands().get(0).band().fromHz(), f0 * (Math.sqrt(1 + 2.5e-9) - 5e-5));
    assertNear(result.bands().get(0).band().toHz(), f0 * (Math.sqrt(1 + 2.5e-9) + 5e-5));
  }

  @Test
  void highQualityIsNotUnbounded() {
    Resonator high = new Resonator(1e6, 1e4, 1e6);
    assertNear(worst(judge(Formula.alone(high.parallel()), below(1, WIDE))), 1e6);
  }

  @Test
  void undeterminedPointsLeaveTheLimitUndeterminedUnlessItIsBroken() {
    Comparison comparison =
        Formula.alone(
            hz -> hz > 1000 && hz < 2000 ? Ohms.UNDETERMINED : Ohms.of(hz < 100 ? 3 : 1, 0));
    LimitJudgement open = judge(comparison, below(5, WIDE));
    assertThat(open.verdict()).isEqualTo(Verdict.UNDETERMINED);
    assertThat(open.undetermined()).contains("no solution").contains("Hz");
    assertThat(worst(open)).isEqualTo(3);
    LimitJudgement broken = judge(comparison, below(2, WIDE));
    assertThat(broken.verdict()).isEqualTo(Verdict.BROKEN);
    assertNear(broken.bands().get(0).band().toHz(), 100);
  }

  @Test
  void bandEndsWhereNothingIsKnownAndGoesOnAcrossASingleUnknownPoint() {
    Comparison edge =
        Formula.alone(hz -> hz > 1000 && hz < 2000 ? Ohms.UNDETERMINED : Ohms.of(1000 / hz, 0));
    BrokenBand band = judge(edge, below(0.9, WIDE)).bands().get(0);
    assertThat(band.band().fromHz()).isEqualTo(10);
    assertNear(band.band().toHz(), 1000);
    Comparison hole = Formula.alone(hz -> hz == 10_000 ? Ohms.UNDETERMINED : Ohms.of(1, 0));
    Limit limit = below(0.9, new Band(1000, 100_000));
    LimitJudgement across = judge(hole, limit);
    assertThat(across.undetermined()).endsWith("at 10000 Hz");
    assertThat(across.bands()).extracting(BrokenBand::band).containsExactly(limit.scope().get(0));
  }

  @Test
  void nothingDeterminedHasNoWorstPoint() {
    LimitJudgement result = judge(Formula.alone(hz -> Ohms.UNDETERMINED), below(5, WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.UNDETERMINED);
    assertThat(result.worst()).isEmpty();
  }

  @Test
  void changeThatIsExactlyZeroIsKept() {
    LimitJudgement result =
        judge(
            Formula.ofChange(hz -> Complex.ZERO),
            limit(Criterion.CHANGE, Bound.atMost(0.01), WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(worst(result)).isZero();
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(10);
  }
}
