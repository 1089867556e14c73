package loadmark.judge;

import java.util.List;
import loadmark.network.Network;

/** A whole network, judged: every case at every port for which a limit holds. */
public record NetworkJudgement(Network network, Verdict verdict, List<CaseJudgement> cases) {
  public NetworkJudgement {
    cases = List.copyOf(cases);
  }
}
