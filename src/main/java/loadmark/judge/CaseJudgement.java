package loadmark.judge;

import java.util.List;
import loadmark.network.Case;
import loadmark.network.Port;

/**
 * One case at one port, judged against every limit that holds there.
 *
 * @param blame one entry a load, where a case of several loads is broken
 */
public record CaseJudgement(
    Case judged, Port port, Verdict verdict, List<LimitJudgement> limits, List<Blame> blame) {
  public CaseJudgement {
    limits = List.copyOf(limits);
    blame = List.copyOf(blame);
  }
}
