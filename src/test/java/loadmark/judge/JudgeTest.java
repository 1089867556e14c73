package loadmark.judge;

import static loadmark.judge.Formula.limit;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Load;
import loadmark.response.Ohms;
import loadmark.response.PortResponse;
import org.junit.jupiter.api.Test;

class JudgeTest {
  private static final Band BAND = new Band(10, 1000);
  private static final Load HEAVY = Formula.load("heavy");
  private static final Load LIGHT = Formula.load("light");
  private static final Case LIGHT_ALONE = new Case("light", List.of(LIGHT), List.of(), 1);
  private static final Case BOTH = new Case("both", List.of(HEAVY, LIGHT), List.of(), 1);
  private static final Case ADDED = new Case("added", List.of(HEAVY, LIGHT), List.of(HEAVY), 1);

  /** 100 Ω bare; the heavy load takes half of it, the light one a hundredth of what is left. */
  private static final PortResponse PORT =
      (loads, against) -> Formula.of(hz -> Ohms.of(ohm(against), 0), hz -> Ohms.of(ohm(loads), 0));

  private static double ohm(List<Load> loads) {
    return 100 * (loads.contains(HEAVY) ? 0.5 : 1) * (loads.contains(LIGHT) ? 0.99 : 1);
  }

  @Test
  void casesAreJudgedInOrderAndTheWorstDecides() {
    NetworkJudgement result =
        Formula.judge(
            List.of(LIGHT_ALONE, BOTH),
            List.of(
                Formula.in(
                    limit(Criterion.CHANGE, Bound.atMost(0.02), BAND), List.of(LIGHT_ALONE, BOTH))),
            PORT);
    assertThat(result.verdict()).isEqualTo(Verdict.BROKEN);
    assertThat(result.cases())
        .extracting(CaseJudgement::verdict)
        .containsExactly(Verdict.KEPT, Verdict.BROKEN);
  }

  @Test
  void blameSaysWhatEachLoadTakenOffWouldLeave() {
    CaseJudgement both =
        Formula.judge(
                List.of(BOTH),
                List.of(
                    Formula.in(limit(Criterion.MAGNITUDE, Bound.atMost(200), BAND), List.of(BOTH)),
                    Formula.in(limit(Criterion.CHANGE, Bound.atMost(0.02), BAND), List.of(BOTH))),
                PORT)
            .cases()
            .get(0);
    assertThat(both.blame())
        .extracting(Blame::withoutLoad, Blame::verdict)
        .containsExactly(tuple(HEAVY, Verdict.KEPT), tuple(LIGHT, Verdict.BROKEN));
    assertThat(both.blame().get(0).worst().orElseThrow().value().orElseThrow())
        .isCloseTo(0.01, within(1e-15));
  }

  @Test
  void loadTakenOffLeavesTheReferenceToo() {
    CaseJudgement added =
        Formula.judge(
                List.of(ADDED),
                List.of(
                    Formula.in(limit(Criterion.CHANGE, Bound.atMost(0.001), BAND), List.of(ADDED))),
                PORT)
            .cases()
            .get(0);
    // Without the heavy load the light one stands against the bare network: still 1 %.
    assertThat(added.blame())
        .extracting(Blame::verdict)
        .containsExactly(Verdict.BROKEN, Verdict.KEPT);
  }

  @Test
  void keptCaseAndCaseOfOneLoadBlameNobody() {
    NetworkJudgement result =
        Formula.judge(
            List.of(LIGHT_ALONE, BOTH),
            List.of(
                Formula.in(
                    limit(Criterion.CHANGE, Bound.atMost(0.001), BAND), List.of(LIGHT_ALONE)),
                Formula.in(limit(Criterion.CHANGE, Bound.atMost(0.9), BAND), List.of(BOTH))),
            PORT);
    assertThat(result.cases()).allSatisfy(c -> assertThat(c.blame()).isEmpty());
  }

  @Test
  void absoluteLimitHasTheVerdictOfTheBareNetworkBesideIt() {
    List<LimitJudgement> limits =
        Formula.judge(
                List.of(Case.bare(), BOTH),
                List.of(
                    Formula.in(
                        limit(Criterion.MAGNITUDE, Bound.atLeast(80), BAND),
                        List.of(Case.bare(), BOTH)),
                    Formula.in(limit(Criterion.MAGNITUDE, Bound.atMost(80), BAND), List.of(BOTH)),
                    Formula.in(limit(Criterion.CHANGE, Bound.atMost(0.9), BAND), List.of(BOTH))),
                PORT)
            .cases()
            .stream()
            .flatMap(c -> c.limits().stream())
            .toList();
    assertThat(limits)
        .extracting(LimitJudgement::verdict)
        .containsExactly(Verdict.KEPT, Verdict.BROKEN, Verdict.KEPT, Verdict.KEPT);
    assertThat(limits)
        .extracting(LimitJudgement::bareVerdict)
        .containsExactly(
            Optional.of(Verdict.KEPT),
            Optional.of(Verdict.KEPT),
            Optional.of(Verdict.BROKEN),
            Optional.empty());
  }
}
