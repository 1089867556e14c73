package loadmark.judge;

import static loadmark.judge.Formula.judge;
import static loadmark.judge.Formula.limit;
import static loadmark.judge.Formula.omega;
import static loadmark.judge.Formula.resistor;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Criterion;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.response.Change;
import loadmark.response.Comparison;
import loadmark.response.Ohms;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.complex.ComplexUtils;
import org.junit.jupiter.api.Test;

class MeasureTest {
  /** What the results promise of edges and worst values. */
  private static final double RELATIVE = 1e-9;

  private static final Band WIDE = new Band(10, 1e6);
  private static final Band POINT = Band.at(1000);

  private static void assertNear(double actual, double expected) {
    assertThat(actual).isCloseTo(expected, within(RELATIVE * Math.abs(expected)));
  }

  private static double value(LimitJudgement judgement) {
    return judgement.worst().orElseThrow().value().orElseThrow();
  }

  private static DoubleFunction<Ohms> constant(double re, double im) {
    return hz -> Ohms.of(re, im);
  }

  private static Comparison change(double re, double im) {
    return Formula.ofChange(hz -> new Complex(re, im));
  }

  @Test
  void openBarePortIsAChangeOfOne() {
    LimitJudgement result =
        judge(
            Formula.of(hz -> Ohms.OPEN, constant(50, 0)),
            limit(Criterion.CHANGE, Bound.atMost(0.5), POINT));
    assertThat(value(result)).isEqualTo(1);
    assertThat(result.bands()).hasSize(1);
  }

  @Test
  void openWithAndWithoutIsUndetermined() {
    LimitJudgement result =
        judge(
            Formula.of(hz -> Ohms.OPEN, hz -> Ohms.OPEN),
            limit(Criterion.CHANGE, Bound.atMost(0.5), Band.DC));
    assertThat(result.verdict()).isEqualTo(Verdict.UNDETERMINED);
    assertThat(result.undetermined()).isEqualTo("∞/∞, open with and without at DC");
  }

  @Test
  void shortBarePortIsUnboundedAsARatioAndBoundedInOhms() {
    Comparison comparison = Formula.of(constant(0, 0), constant(3, 4));
    LimitJudgement ratio = judge(comparison, limit(Criterion.CHANGE, Bound.atMost(0.5), POINT));
    assertThat(ratio.verdict()).isEqualTo(Verdict.BROKEN);
    assertThat(ratio.worst().orElseThrow().value()).isEmpty();
    LimitJudgement ohms = judge(comparison, limit(Criterion.CHANGE, Bound.atMostOhm(6), POINT));
    assertThat(ohms.verdict()).isEqualTo(Verdict.KEPT);
    assertNear(ohms.worst().orElseThrow().valueOhm().orElseThrow(), 5);
    LimitJudgement either =
        judge(comparison, limit(Criterion.CHANGE, Bound.atMost(0.5).orAtMostOhm(6), POINT));
    assertThat(either.verdict()).isEqualTo(Verdict.KEPT);
  }

  @Test
  void eitherBoundAloneKeepsWhereTheOtherIsUndetermined() {
    Comparison zeros = Formula.of(constant(0, 0), constant(0, 0));
    assertThat(
            judge(zeros, limit(Criterion.CHANGE, Bound.atMost(0.1).orAtMostOhm(1), POINT))
                .verdict())
        .isEqualTo(Verdict.KEPT);
  }

  @Test
  void differenceInOhmsComesFromTheChange() {
    // 1 kΩ changed by 1e-12: the two impedances alone would leave four digits.
    Comparison comparison =
        new Formula.Of(
            constant(1000, 0),
            constant(1000 * (1 + 1e-12), 0),
            Optional.of(hz -> Change.of(1e-12, 0)));
    LimitJudgement result =
        judge(comparison, limit(Criterion.CHANGE, Bound.atMostOhm(1e-9 / 2), POINT));
    assertNear(result.worst().orElseThrow().valueOhm().orElseThrow(), 1e-9);
    assertThat(result.verdict()).isEqualTo(Verdict.BROKEN);
  }

  @Test
  void magnitudeAndPhaseChangeAreThoseOfOnePlusTheChange() {
    // 1 + h = 0.6 + j0.8 has |1 + h| = 1: no change of magnitude, atan2(0.8, 0.6) of phase.
    Comparison turned = change(-0.4, 0.8);
    assertThat(value(judge(turned, limit(Criterion.MAGNITUDE_CHANGE, Bound.atMost(1), POINT))))
        .isCloseTo(0, within(1e-15));
    assertNear(
        value(judge(turned, limit(Criterion.PHASE_CHANGE, Bound.atMost(90), POINT))),
        Math.toDegrees(Math.atan2(0.8, 0.6)));
    // |1 + h| − 1 = Re h + (Im h)²/2 to second order.
    Comparison tiny = change(3e-12, 4e-12);
    assertNear(
        value(judge(tiny, limit(Criterion.MAGNITUDE_CHANGE, Bound.atMost(1), POINT))), 3e-12);
    assertNear(
        value(judge(tiny, limit(Criterion.PHASE_CHANGE, Bound.atMost(1), POINT))),
        Math.toDegrees(4e-12));
  }

  @Test
  void phaseChangeOfAHalfTurnIs180() {
    LimitJudgement result =
        judge(
            Formula.of(constant(5, 0), constant(-1, 0)),
            limit(Criterion.PHASE_CHANGE, Bound.atMost(170), POINT));
    assertThat(value(result)).isEqualTo(180);
  }

  @Test
  void heavyLoadKeepsTheDigitsOfItsPhase() {
    // Z_with is 1e-9 of Z_without: 1 + h would leave seven digits of the angle.
    Comparison comparison = Formula.of(constant(1e9, 0), constant(0.6, 0.8));
    assertNear(
        value(judge(comparison, limit(Criterion.PHASE_CHANGE, Bound.atMost(90), POINT))),
        Math.toDegrees(Math.atan2(0.8, 0.6)));
  }

  @Test
  void shortHasNoPhase() {
    LimitJudgement result =
        judge(Formula.alone(constant(0, 0)), limit(Criterion.PHASE, Bound.between(-10, 10), POINT));
    assertThat(result.undetermined()).isEqualTo("a short has no phase at 1000 Hz");
  }

  @Test
  void phaseWindowRunsThroughTheHalfTurn() {
    // The phase goes from 160° up to 200° = −160°, linearly in log f.
    Comparison comparison =
        Formula.alone(
            hz ->
                Formula.ohms(
                    ComplexUtils.polar2Complex(
                        1, Math.PI + Math.toRadians(20) * (Math.log10(hz) - 3))));
    LimitJudgement result =
        judge(comparison, limit(Criterion.PHASE, Bound.between(170, 185), new Band(100, 1e4)));
    assertThat(result.bands()).hasSize(2);
    assertNear(result.bands().get(0).band().toHz(), Math.pow(10, 2.5));
    assertNear(result.bands().get(1).band().fromHz(), Math.pow(10, 3.25));
    assertNear(value(result), 200);
  }

  @Test
  void windowWithAnEdgeAtZeroForgivesRounding() {
    LimitJudgement result =
        judge(
            Formula.alone(constant(50, -1e-14)),
            limit(Criterion.PHASE, Bound.between(0, 90), WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
  }

  @Test
  void lossFreeReactanceOnTheEdgeOfItsWindowIsKept() {
    LimitJudgement result =
        judge(
            Formula.alone(hz -> Ohms.of(0, -1 / (omega(hz) * 1e-9))),
            limit(Criterion.PHASE, Bound.between(-90, 90), WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(value(result)).isEqualTo(-90);
  }

  @Test
  void magnitudeWindowIsWorstAtTheLargerRatio() {
    // |Z| from 20 Ω to 300 Ω in a window of 100 Ω to 200 Ω: 100/20 beats 300/200.
    LimitJudgement result =
        judge(
            Formula.alone(hz -> Ohms.of(hz, 0)),
            limit(Criterion.MAGNITUDE, Bound.between(100, 200), new Band(20, 300)));
    assertThat(result.bands()).hasSize(2);
    assertNear(result.bands().get(0).band().toHz(), 100);
    assertNear(result.bands().get(1).band().fromHz(), 200);
    assertThat(value(result)).isEqualTo(20);
  }

  @Test
  void openPortIsUnboundedBelowAndKeptAbove() {
    Comparison open = Formula.alone(hz -> Ohms.OPEN);
    LimitJudgement below = judge(open, limit(Criterion.MAGNITUDE, Bound.atMost(100), Band.DC));
    assertThat(below.verdict()).isEqualTo(Verdict.BROKEN);
    assertThat(below.worst().orElseThrow().value()).isEmpty();
    LimitJudgement above = judge(open, limit(Criterion.MAGNITUDE, Bound.atLeast(100), Band.DC));
    assertThat(above.verdict()).isEqualTo(Verdict.KEPT);
  }

  @Test
  void magnitudeAndPhaseAreHeldAgainstAReference() {
    // R + jωL against R: |Z|/R − 1 = √(1 + x²) − 1, arg = atan x, x = ωL/R.
    Comparison comparison = Formula.alone(hz -> Ohms.of(100, omega(hz) * 1e-3));
    LimitJudgement magnitude =
        judge(
            comparison, limit(Criterion.MAGNITUDE_WITHIN, Bound.atMost(0.2), resistor(100), WIDE));
    assertNear(
        magnitude.bands().get(0).band().fromHz(), Math.sqrt(0.44) * 100 / 1e-3 / (2 * Math.PI));
    LimitJudgement phase =
        judge(comparison, limit(Criterion.PHASE_WITHIN, Bound.atMost(11.5), resistor(100), WIDE));
    assertNear(
        phase.bands().get(0).band().fromHz(),
        Math.tan(Math.toRadians(11.5)) * 100 / 1e-3 / (2 * Math.PI));
  }

  @Test
  void inductorIsANegativeParallelCapacitance() {
    // Im(1/jωL)/ω = −1/(ω²L).
    double henry = 1e-3;
    LimitJudgement result =
        judge(
            Formula.alone(hz -> Ohms.of(0, omega(hz) * henry)),
            limit(
                Criterion.PARALLEL_CAPACITANCE, Bound.between(-20e-9, -10e-9), new Band(1e3, 1e5)));
    assertThat(result.bands()).hasSize(2);
    assertNear(result.bands().get(0).band().toHz(), 1 / Math.sqrt(henry * 20e-9) / (2 * Math.PI));
    assertNear(result.bands().get(1).band().fromHz(), 1 / Math.sqrt(henry * 10e-9) / (2 * Math.PI));
    assertNear(value(result), -1 / (Math.pow(omega(1e3), 2) * henry));
  }

  @Test
  void capacitanceAtItsBoundIsKeptAndNoneAtDirectCurrent() {
    Comparison capacitor =
        Formula.alone(hz -> hz == 0 ? Ohms.OPEN : Ohms.of(0, -1 / (omega(hz) * 75e-12)));
    assertThat(
            judge(capacitor, limit(Criterion.PARALLEL_CAPACITANCE, Bound.atMost(75e-12), WIDE))
                .verdict())
        .isEqualTo(Verdict.KEPT);
    assertThat(
            judge(capacitor, limit(Criterion.PARALLEL_CAPACITANCE, Bound.atMost(75e-12), Band.DC))
                .undetermined())
        .isEqualTo("no capacitance at DC");
  }

  @Test
  void parallelResistanceOfSeriesRAndCFallsWithFrequency() {
    // R·(1 + 1/(ωRC)²) (series to parallel conversion).
    double ohm = 100;
    double farad = 1e-9;
    LimitJudgement result =
        judge(
            Formula.alone(hz -> Ohms.of(ohm, -1 / (omega(hz) * farad))),
            limit(Criterion.PARALLEL_RESISTANCE, Bound.atLeast(1000), WIDE));
    assertNear(result.bands().get(0).band().fromHz(), 1 / (3 * ohm * farad) / (2 * Math.PI));
    assertNear(value(result), ohm * (1 + Math.pow(omega(1e6) * ohm * farad, -2)));
  }

  @Test
  void losslessPortHasInfiniteParallelResistance() {
    Comparison capacitor = Formula.alone(hz -> Ohms.of(1e-18, -1 / (omega(hz) * 1e-9)));
    LimitJudgement below =
        judge(capacitor, limit(Criterion.PARALLEL_RESISTANCE, Bound.atMost(1e6), WIDE));
    assertThat(below.verdict()).isEqualTo(Verdict.BROKEN);
    assertThat(below.worst().orElseThrow().value()).isEmpty();
    LimitJudgement above =
        judge(capacitor, limit(Criterion.PARALLEL_RESISTANCE, Bound.atLeast(1e6), WIDE));
    assertThat(above.verdict()).isEqualTo(Verdict.KEPT);
  }

  @Test
  void mismatchedResistorHasThePublishedReturnLoss() {
    // 75 Ω in 50 Ω: 20·log10(125/25).
    LimitJudgement result =
        judge(
            Formula.alone(constant(75, 0)),
            limit(Criterion.RETURN_LOSS, Bound.atLeast(14), resistor(50), WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.BROKEN);
    assertNear(value(result), 20 * Math.log10(5));
    assertThat(result.worst().orElseThrow().hz()).isEqualTo(10);
  }

  @Test
  void matchIsUnboundedAndKeptAndAnOpenLosesNothing() {
    LimitJudgement match =
        judge(
            Formula.alone(constant(50, 0)),
            limit(Criterion.RETURN_LOSS, Bound.atLeast(20), resistor(50), WIDE));
    assertThat(match.verdict()).isEqualTo(Verdict.KEPT);
    assertThat(match.worst().orElseThrow().value()).isEmpty();
    LimitJudgement open =
        judge(
            Formula.alone(hz -> Ohms.OPEN),
            limit(Criterion.RETURN_LOSS, Bound.atLeast(20), resistor(50), POINT));
    assertThat(value(open)).isZero();
  }

  @Test
  void returnLossOfAMatchWithSeriesInductanceCrossesAtAKnownFrequency() {
    // |Γ| = x/√(4 + x²), x = ωL/50: 20 dB at x = 2/√99.
    double henry = 1e-6;
    LimitJudgement result =
        judge(
            Formula.alone(hz -> Ohms.of(50, omega(hz) * henry)),
            limit(
                Criterion.RETURN_LOSS,
                Bound.atLeast(20),
                OnePort.series(List.of(resistor(20), resistor(30))),
                new Band(1e3, 1e8)));
    assertNear(
        result.bands().get(0).band().fromHz(), 2 / Math.sqrt(99) * 50 / henry / (2 * Math.PI));
  }

  @Test
  void reactiveReferenceIsTakenAtEachFrequency() {
    OnePort reference =
        OnePort.parallel(List.of(resistor(50), OnePort.of(ElementKind.INDUCTANCE, 50e-6)));
    Comparison same =
        Formula.alone(
            hz -> {
              Complex jwl = new Complex(0, omega(hz) * 50e-6);
              return Formula.ohms(jwl.multiply(50).divide(jwl.add(50)));
            });
    LimitJudgement result =
        judge(same, limit(Criterion.MAGNITUDE_WITHIN, Bound.atMost(1e-12), reference, WIDE));
    assertThat(result.verdict()).isEqualTo(Verdict.KEPT);
  }
}
