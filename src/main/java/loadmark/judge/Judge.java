package loadmark.judge;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Network;
import loadmark.network.Port;
import loadmark.response.Loading;
import loadmark.response.PortResponse;

/** Stand-in: looks at the lowest frequency alone. */
public final class Judge {
  private Judge() {}

  public static NetworkJudgement judge(Network network, Function<Port, PortResponse> responses) {
    List<CaseJudgement> cases = new ArrayList<>();
    Verdict all = Verdict.KEPT;
    for (Port port : network.ports()) {
      for (Case one : network.cases()) {
        List<LimitJudgement> limits = new ArrayList<>();
        Verdict verdict = Verdict.KEPT;
        for (Limit limit : network.limits()) {
          if (!limit.holdsFor(one, port)) {
            continue;
          }
          double hz = limit.scope().get(0).fromHz();
          Loading there = responses.apply(port).compare(one.loads(), one.against()).at(hz);
          double value = there.change().magnitude();
          Verdict said = value > limit.bound().atMost().orElse(1e9) ? Verdict.BROKEN : Verdict.KEPT;
          Worst worst =
              new Worst(
                  hz,
                  OptionalDouble.of(value),
                  OptionalDouble.empty(),
                  there.without(),
                  there.with());
          limits.add(
              new LimitJudgement(
                  limit,
                  said,
                  Optional.empty(),
                  LimitJudgement.Method.SAMPLED,
                  Optional.of(worst),
                  said == Verdict.BROKEN
                      ? List.of(new BrokenBand(limit.scope().get(0), worst))
                      : List.of(),
                  ""));
          verdict = verdict.and(said);
        }
        if (!limits.isEmpty()) {
          cases.add(new CaseJudgement(one, port, verdict, limits, List.of()));
          all = all.and(verdict);
        }
      }
    }
    return new NetworkJudgement(network, all, cases);
  }
}
